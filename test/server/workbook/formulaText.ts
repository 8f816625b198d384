import fc from 'fast-check';

/** Pieces from which texts are joined that come near to formulas and to the edges of their grammar. */
const PIECES = [
  ...[
    'A1',
    '$B$2',
    'c$3',
    '$D4',
    'XFD1048576',
    'ZZZ1',
    'A0',
    'A:B',
    '$1:3',
    'Kettle!A1',
    "'Feed tank'!$A:B",
    'A1(',
  ],
  ...[
    '1',
    '1.5',
    '1E-14',
    '2e5',
    '.5',
    '5.',
    '"',
    '""',
    '"a""b"',
    "'",
    "''",
    '\\',
    'TRUE',
    'false',
    'charge',
    'x.y',
  ],
  ...[
    'SUM(',
    'ABS (',
    ')',
    '(',
    '{',
    '}',
    ',',
    ';',
    ':',
    '!',
    '#',
    '#N/A',
    '@',
    '%',
    '&',
    '=',
    '<>',
    '-',
    '+',
    '^',
  ],
  ...[' ', '\u00a0', '\n', '−', '“', 'é', '日', '😀', '\ud800', '__proto__', 'constructor'],
];

/** Text in the neighbourhood of formulas. */
export const formulaLike = fc
  .array(fc.oneof({ weight: 5, arbitrary: fc.constantFrom(...PIECES) }, fc.string()), { maxLength: 30 })
  .map((pieces) => `=${pieces.join('')}`);
