import fc from 'fast-check';

/** Lines from which documents near to a workbook are joined. */
const LINES = [
  ...[
    'workbook: 1',
    'title: x',
    'about: |',
    'names:',
    'sheets:',
    'inputs:',
    'outputs:',
    'checks:',
    '---',
    '...',
  ],
  ...[
    '  Kettle:',
    '    A1: 1',
    "    B1:B3: '=A1'",
    '    A3:',
    '      - [a, 1, mol]',
    '      -',
    '  - given: {q: 1}',
  ],
  ...[
    '  q: {cell: Kettle!A1}',
    '  r: Kettle!A1:B2',
    '    expect: {r: 0.1}',
    '    within: 0.1 %',
    '    source: x',
  ],
  ...[
    '%YAML 1.1',
    '<<: *a',
    '&a b: *a',
    '!t x: 1',
    '? [x]',
    ': y',
    '\tq: 1',
    '__proto__: 1',
    'constructor: {}',
  ],
];
const PIECES = [
  ...[
    '[',
    ']',
    '{',
    '}',
    ',',
    ':',
    ': ',
    '- ',
    '? ',
    '#',
    ' #',
    '&',
    '*a',
    '!',
    '|',
    '>',
    "'",
    '"',
    '%',
    '@',
    '`',
  ],
  ...['\n', '\n  ', '\n    ', '\t', '\r\n', '\\', '=', '=A1', 'A1', '1', '007', '1e999', '.nan', '~', 'true'],
  ...['\u0000', '\u0085', '\u2028', '\ufeff', '\ud800', '😀', '__proto__', 'constructor', 'toString', '<<'],
];

const line = fc.oneof({ weight: 4, arbitrary: fc.constantFrom(...LINES) }, fc.string());
const piece = fc.oneof({ weight: 4, arbitrary: fc.constantFrom(...PIECES) }, fc.string({ maxLength: 5 }));

/** A sound workbook, so that texts made from it get beyond the parser. */
const SOUND = `workbook: 1
title: x
names: {n: Kettle!A1:B2}
sheets:
  Kettle:
    A1:
      - [acid, 1, mol]
    A3:B4: '=A1&"x"'
inputs:
  q: {cell: Kettle!B1, unit: mol, min: 0}
outputs:
  r: {cell: Kettle!A3, digits: 5}
checks:
  - {given: {q: 1}, expect: {r: 0.5}, within: 0.1 %, source: x}
`;

/** The sound workbook with a part of it overwritten. */
const damaged = fc
  .tuple(fc.nat(SOUND.length), fc.nat(3), fc.array(piece, { maxLength: 2 }))
  .map(([at, cut, pieces]) => SOUND.slice(0, at) + pieces.join('') + SOUND.slice(at + cut));

/** Texts in the neighbourhood of text workbooks. */
export const yamlLike = fc.oneof(
  fc.array(line, { maxLength: 20 }).map((lines) => lines.join('\n')),
  fc.array(piece, { maxLength: 40 }).map((pieces) => pieces.join('')),
  { weight: 3, arbitrary: damaged },
);
