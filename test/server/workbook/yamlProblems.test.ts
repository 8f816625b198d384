import { describe, expect, it } from 'vitest';
import { READING_ERRORS } from '../../../server/problemTables/reading.ts';
import { SIZE_ERRORS } from '../../../server/problemTables/limits.ts';
import { WORKBOOK_ERRORS } from '../../../server/problemTables/workbook.ts';
import { UnusableWorkbook } from '../../../server/workbook/fileProblems.ts';
import { MAX_WORKBOOK_BYTES, readYamlWorkbook } from '../../../server/workbook/yaml.ts';
import { kettle, problemsOf } from './readText.ts';

const INPUTS = (inputs: string) => kettle("A1: [[acid, 2, mol], [sum, '=B1', mol]]", `inputs: ${inputs}`);
const CHECKS = (check: string) =>
  kettle(
    'A1: [[acid, 2, mol]]',
    `inputs: {acid: {cell: Kettle!B1, min: 0}}\noutputs: {total: {cell: Kettle!B1}}\nchecks: [${check}]`,
  );

/** Text, where its one problem lies, its code, and words of its message. In `kettle` sheets begin on line 5. */
const PROBLEMS: [text: string, place: string, code: string, words: string][] = [
  // what trips people in YAML
  [kettle('A1: [[5, %]]'), '5:14', 'yaml-syntax', "begins with a sign in quotes: '%'"],
  [kettle('A1: % of feed'), '5:9', 'yaml-syntax', "'%'"],
  [kettle('A1: [[a, , b]]'), '5:14', 'yaml-syntax', 'Write an empty item as null'],
  [kettle('A1: Note: see B1'), '5:9', 'yaml-syntax', 'Put text that holds ": " in quotes'],
  [kettle('A1: =B1: 3'), '5:9', 'yaml-syntax', 'in quotes'],
  [kettle('A1:\n\t- [a]'), '6:5', 'yaml-syntax', 'Indent with spaces'],
  [kettle("A1: 'it's'"), '5:13', 'yaml-syntax', "'it''s'"],
  [kettle('A1: "C:\\dir"'), '5:12', 'yaml-syntax', 'use single quotes'],
  [kettle('A1: [[a, -]]'), '5:14', 'yaml-syntax', 'lone sign'],
  [kettle('A1: "open'), '6:1', 'yaml-syntax', 'Close each quote'],
  [kettle('A1: [[a]'), '6:1', 'yaml-syntax', 'Close each bracket'],
  [`${kettle('A1: 1')}---\n${kettle('A1: 1')}`, '6:1', 'yaml-syntax', 'one document'],
  [`%YAML 9.9\n---\n${kettle('A1: 1')}`, '1:7', 'yaml-syntax', 'version'],
  [kettle('A1: *acid'), '5:9', 'yaml-alias', 'begins with *'],
  [kettle('A1: &acid 1'), '5:15', 'yaml-alias', 'begins with &'],
  [kettle('A1: !acid'), '5:14', 'yaml-tag', 'the tag !acid'],
  [kettle('A1: !!str 7'), '5:15', 'yaml-tag', 'in quotes'],
  [kettle('? [A1]\n: 1'), '5:7', 'yaml-key', 'stands before a colon'],
  [kettle('A1: 1\nB1: 2\nA1: 3'), '7:5', 'yaml-key-twice', 'the key A1 stands twice'],
  [kettle('A1: 007'), '5:9', 'yaml-number', '007 would be read as 7'],
  [kettle('A1: 0x1F'), '5:9', 'yaml-number', '31'],
  [kettle('A1: .inf'), '5:9', 'yaml-number', 'Infinity'],
  [kettle('A1: .nan'), '5:9', 'yaml-number', 'NaN'],
  [kettle('A1: 1e999'), '5:9', 'yaml-number', 'Infinity'],
  [kettle('A1: 1e-999'), '5:9', 'yaml-number', 'read as 0'],
  [kettle('A1: 12345678901234567890'), '5:9', 'yaml-number', '12345678901234567000'],
  [kettle('A1: 1,5'), '5:9', 'yaml-comma-number', 'decimal point'],
  [kettle('A1: -1,000.5'), '5:9', 'yaml-comma-number', '1000'],
  [kettle('A1: =B1 # note'), '5:9', 'yaml-formula-unquoted', "'=A1+B1'"],
  [kettle('A1: "a\\u0007b"'), '5:9', 'yaml-control-character', 'U+0007'],
  [kettle('A1: "\\ud800"'), '5:9', 'yaml-control-character', 'U+D800'],

  // the shape of a workbook
  ['', '1:1', 'workbook-version', 'workbook: 1'],
  ['# nothing yet', '1:1', 'workbook-version', 'workbook: 1'],
  ['title: Test', '1:1', 'workbook-version', 'workbook: 1'],
  ['[1, 2]', '1:1', 'workbook-version', 'workbook: 1'],
  [kettle('A1: 1').replace('1\n', '2\n'), '1:11', 'workbook-item', 'workbook is 2. Give 1.'],
  [kettle('A1: 1', 'abuot: x'), '6:1', 'workbook-key', 'Did you mean about?'],
  [kettle('A1: 1', 'constructor: x'), '6:1', 'workbook-key', 'no item called constructor'],
  [INPUTS('{acid: {cell: Kettle!B1, units: mol}}'), '6:34', 'workbook-key', 'Did you mean unit?'],
  [kettle('A1: 1').replace('title: Test\n', ''), '1:1', 'workbook-missing', 'the workbook has no title'],
  [INPUTS('{acid: {unit: mol}}'), '6:16', 'workbook-missing', 'inputs.acid has no cell'],
  [INPUTS('{acid: Kettle!B1}'), '6:16', 'workbook-item', 'inputs.acid is the text "Kettle!B1"'],
  [
    INPUTS('{acid: {cell: Kettle!B1, min: low}}'),
    '6:39',
    'workbook-item',
    'inputs.acid.min is the text "low"',
  ],
  [kettle('A1: 1', 'outputs: {x: {cell: Kettle!A1, digits: 18}}'), '6:40', 'workbook-item', '1 to 17'],
  [kettle('A1: 1', 'checks: {}'), '6:9', 'workbook-item', 'a list of checks'],
  [CHECKS('{expect: {total: 1}, within: 1}'), '8:10', 'workbook-missing', 'check 1 has no source'],
  [CHECKS('{expect: {total: 1}, within: 1 mol, source: x}'), '8:39', 'workbook-item', 'such as 0.1 %'],
  [CHECKS('{expect: {total: 1}, within: 100 %, source: x}'), '8:39', 'workbook-item', 'such as 0.1 %'],
  [CHECKS('{expect: {total: 1}, within: -1, source: x}'), '8:39', 'workbook-item', 'not below 0'],
  [CHECKS("{expect: {}, source: ''}"), '8:31', 'workbook-item', 'where the expected values come from'],
  [CHECKS('{expect: {total: {status: fine}}, source: x}'), '8:27', 'workbook-item', 'settled, at limit'],

  // sheets
  [kettle('A1: 1').replace('Kettle', '"a:b"'), '4:3', 'sheet-name', 'cannot be called "a:b"'],
  [kettle('A1: 1').replace('Kettle', 'x'.repeat(32)), '4:3', 'sheet-name', '1 to 31 characters'],
  [kettle('A1: 1').replace('Kettle', "'it'''"), '4:3', 'sheet-name', 'no apostrophe at either end'],
  [`${kettle('A1: 1')}  kettle: {A1: 1}`, '6:3', 'sheet-name-twice', 'Kettle and kettle'],
  [kettle('1A: 1'), '5:5', 'sheet-address', '1A is no cell'],
  [kettle('$A$1: 1'), '5:5', 'sheet-address', 'G4:G7'],
  [kettle('A1048577: 1'), '5:5', 'sheet-address', 'A1048577'],
  [kettle('XFD1: [[1, 2]]'), '5:5', 'block-off-sheet', 'last row or column'],
  [kettle('A300000: 1'), '4:3', 'sheet-too-large', 'reaches to A300000, which makes 300000 cells'],
  [kettle('XFD100: 1'), '4:3', 'sheet-too-large', 'limit is 200000'],
  [kettle('A1: # of moles'), '5:5', 'cell-empty', 'begins with # must be in quotes'],
  [kettle('A1: []'), '5:5', 'cell-empty', 'A1 has no value'],
  [kettle('A1:\n  - [a: b]'), '6:10', 'cell-mapping', 'the entry a is read as a key and a value'],
  [kettle('A1: {text: 5}'), '5:9', 'cell-mapping', 'in quotes'],
  [kettle('A1: [[[a]]]'), '5:11', 'cell-mapping', 'a list inside a row'],
  [kettle('A1: [a, b]'), '5:10', 'block-rows', 'item 1 of the block A1 is no row'],
  [kettle('A1:\n  - [a]\n  - b'), '7:9', 'block-rows', 'item 2'],
  [kettle('A1:\n  - [a, b]\n  - [c, 1,5]'), '7:9', 'block-row-too-long', 'row 2 of the block A1 has 3 items'],
  [kettle('A1:A2: [[1], [2]]'), '5:12', 'block-in-range', 'at its first cell: A1'],
  [kettle('A1: [[1], [2]]\nA2: 3'), '6:5', 'block-overlap', 'A2 and A1 both give a value to A2'],
  [kettle("B2:B4: '=A1048575'"), '5:5', 'fill-off-sheet', 'filled into B4, the reference A1048575'],

  // names, inputs, outputs, checks
  [kettle('A1: 1', 'names: {K1: Kettle!A1}'), '6:9', 'name-word', 'K_1 is one'],
  [kettle('A1: 1', 'names: {"true": Kettle!A1}'), '6:9', 'name-word', 'TRUE'],
  [kettle('A1: 1', 'names: {a.b: Kettle!A1}'), '6:9', 'name-word', 'letters, digits and _'],
  [kettle('A1: 1', 'names: {Kp: Kettle!A1, kp: Kettle!A1}'), '6:24', 'name-twice', 'capitals'],
  [kettle('A1: 1', 'names: {Kp: A1}'), '6:13', 'reference-form', 'the name Kp points at A1'],
  [kettle('A1: 1', 'outputs: {x: {cell: Kettle!A:A}}'), '6:21', 'reference-form', 'Kettle!B4'],
  [kettle('A1: 1', 'outputs: {x: {cell: Ketle!A1}}'), '6:21', 'reference-sheet', 'Did you mean Kettle?'],
  [kettle('A1: 1', 'outputs: {a b: {cell: Kettle!A1}}'), '6:11', 'item-name', '"a b"'],
  [INPUTS('{acid: {cell: Kettle!A1:B1}}'), '6:23', 'input-range', 'more than one cell'],
  [INPUTS('{acid: {cell: Kettle!B2}}'), '6:23', 'input-formula', 'Kettle!B2, which holds a formula'],
  [INPUTS('{acid: {cell: Kettle!B3}}'), '6:23', 'input-blank', 'Kettle!B3, which is blank'],
  [INPUTS('{acid: {cell: Kettle!B1, min: 3}}'), '6:16', 'input-limits', 'holds 2, outside'],
  [INPUTS('{acid: {cell: Kettle!B1, min: 3, max: 1}}'), '6:16', 'input-limits', 'min 3 is above max 1'],
  [INPUTS('{acid: {cell: Kettle!B1, uncertainty: -1}}'), '6:16', 'input-limits', 'negative'],
  [INPUTS('{acid: {cell: Kettle!A1, max: 1}}'), '6:16', 'input-limits', 'holds no number'],
  [
    INPUTS('{acid: {cell: Kettle!B1, unit: kmol}}'),
    '6:40',
    'input-unit',
    'kmol, but the cell beside Kettle!B1',
  ],
  [
    `${INPUTS('{acid: {cell: Kettle!B1}}')}\noutputs: {Acid: {cell: Kettle!B1}}`,
    '7:11',
    'name-twice',
    'the name Acid is taken by the input acid',
  ],
  [
    CHECKS('{given: {acdi: 1}, expect: {total: x}, source: x}'),
    '8:19',
    'check-name',
    'no input of the workbook',
  ],
  [CHECKS('{expect: {totl: x}, source: x}'), '8:20', 'check-name', 'Did you mean total?'],
  [CHECKS('{expect: {total: x}, within: {totl: 1}, source: x}'), '8:40', 'check-name', 'no expected output'],
  [CHECKS('{expect: {constructor: x}, source: x}'), '8:20', 'check-name', 'constructor'],
  [CHECKS('{given: {acid: -1}, expect: {total: x}, source: x}'), '8:25', 'check-given', 'sets acid to -1'],
  [CHECKS('{expect: {total: 1}, source: x}'), '8:27', 'check-tolerance', 'within: 0.001'],
  [CHECKS('{expect: {}, source: x}'), '8:19', 'check-empty', 'check 1 expects nothing'],
  [CHECKS('{expect: {total: 0}, within: 1 %, source: x}'), '8:27', 'check-zero', 'an absolute tolerance'],
  [CHECKS('{expect: {total: [[a], [b]]}, source: x}'), '8:27', 'check-block', '2 rows of 1'],
];

describe('what is wrong with a text workbook', () => {
  it.each(PROBLEMS)('is told with its place: %j', (text, place, code, words) => {
    const problems = problemsOf(text);
    expect(problems.map(({ code: found, line, column }) => [found, `${line}:${column}`])).toEqual([
      [code, place],
    ]);
    expect(problems[0]?.message).toContain(words);
  });

  it('includes a file that is too large or no text', () => {
    const read = (bytes: Uint8Array) => () => readYamlWorkbook(bytes, '-');
    expect(read(new Uint8Array(MAX_WORKBOOK_BYTES + 1))).toThrow(/^-:1:1: the workbook has 1048577 bytes/);
    expect(read(new Uint8Array([0xff, 0xfe, 0x00]))).toThrow(/^-:1:1: the file is not text in UTF-8/);
  });

  it('has a test for every code of the reader', () => {
    const tested = new Set(PROBLEMS.map(([, , code]) => code));
    const codes = Object.keys({ ...READING_ERRORS, ...WORKBOOK_ERRORS, ...SIZE_ERRORS });
    const elsewhere = ['workbook-too-large', 'workbook-not-utf8', 'yaml-too-deep'];
    expect(codes.filter((code) => !tested.has(code) && !elsewhere.includes(code))).toEqual([]);
  });

  it('includes brackets within brackets, however many', () => {
    for (const depth of [12, 100, 100_000]) {
      const problems = problemsOf(kettle(`A1: ${'['.repeat(depth)}1${']'.repeat(depth)}`));
      // The parser itself gives up on the deepest; what remains of the value is no row of cells.
      expect(problems.map(({ code }) => code)).toContain(depth < 1000 ? 'yaml-too-deep' : 'yaml-syntax');
    }
  });

  it('is told all at once, in the order of the file', () => {
    const text = kettle('A1: 007\nB1: =A1\nC1:', 'titel: x\ninputs: {q: {cell: Kettle!A1, max: high}}');
    expect(problemsOf(text).map(({ code, line }) => [code, line])).toEqual([
      ['yaml-number', 5],
      ['yaml-formula-unquoted', 6],
      ['cell-empty', 7],
      ['workbook-key', 8],
      ['workbook-item', 9],
    ]);
  });

  it('is told on one line each', () => {
    expect(() => readYamlWorkbook(new TextEncoder().encode('title: x'), 'kettle.yaml')).toThrow(
      UnusableWorkbook,
    );
    expect(problemsOf('workbook: 1').map(({ message }) => message)).toEqual([
      'the workbook has no title. Give a text (a number in quotes is one).',
      'the workbook has no sheets. Give sheets by name, each with its addresses.',
    ]);
  });

  it('is not a key that JavaScript gives a meaning to', () => {
    const entries = 'A1: [[acid, 2, mol]]';
    const further = 'inputs: {toString: {cell: Kettle!B1}}\noutputs: {constructor: {cell: Kettle!B1}}';
    const text = `${kettle(entries, further)}\nchecks: [{given: {toString: 1}, expect: {constructor: a}, source: x}]`;
    expect(problemsOf(text.replace('Kettle:', 'constructor:').replaceAll('Kettle!', 'constructor!'))).toEqual(
      [],
    );
  });

  it.each([
    '__proto__: 1\n',
    'names: {__proto__: Kettle!A1}',
    'inputs: {__proto__: {cell: Kettle!A1}}',
    'outputs: {__proto__: {cell: Kettle!A1}}',
    'checks: [{given: {__proto__: 1}, expect: {}, source: x}]',
    'checks: [{expect: {__proto__: 1}, source: x}]',
    'checks: [{expect: {}, within: {__proto__: 1}, source: x}]',
    'inputs: {q: {cell: Kettle!A1, __proto__: {}}}',
  ])('includes the key __proto__ in every map: %s', (further) => {
    expect(problemsOf(kettle('A1: 1', further)).map(({ code }) => code)).toEqual(['yaml-key']);
    expect(problemsOf(kettle('__proto__: 1')).map(({ code }) => code)).toEqual(['yaml-key']);
    expect(problemsOf(kettle('A1: 1').replace('Kettle', '__proto__')).map(({ code }) => code)).toEqual([
      'yaml-key',
    ]);
  });

  it('does not include a reference to the last cell of a sheet', () => {
    expect(problemsOf(kettle("B2:B3: '=A1048575'"))).toEqual([]);
  });

  it('is found at once in a bomb of aliases', () => {
    const bomb = Array.from(
      { length: 20 },
      (_, level) => `a${level}: &a${level} [${`*a${level - 1},`.repeat(9)}]`,
    );
    const problems = problemsOf(`${kettle('A1: 1')}\n${bomb.join('\n').replaceAll('*a-1', 'lol')}`);
    expect(new Set(problems.map(({ code }) => code))).toEqual(new Set(['yaml-alias']));
  });
});
