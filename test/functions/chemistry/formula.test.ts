import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { ATOMIC_WEIGHTS } from '../../../functions/data/atomicWeights.ts';
import { parseFormula } from '../../../functions/chemistry/formula.ts';
import { toNumber } from '../../../functions/chemistry/rational.ts';
import { messageOf } from '../raises.ts';

const atomsOf = (text: string) =>
  Object.fromEntries([...parseFormula(text).atoms].map(([symbol, count]) => [symbol, toNumber(count)]));

// counted by hand
test.each([
  ['H2O', { H: 2, O: 1 }],
  ['Ca(OH)2', { Ca: 1, O: 2, H: 2 }],
  ['Fe4[Fe(CN)6]3', { Fe: 7, C: 18, N: 18 }],
  ['(NH4)2Fe(SO4)2', { N: 2, H: 8, Fe: 1, S: 2, O: 8 }],
  ['CuSO4·5H2O', { Cu: 1, S: 1, O: 9, H: 10 }],
  ['Ca(OH)2.H2O', { Ca: 1, O: 3, H: 4 }],
  ['CaSO4·1/2H2O', { Ca: 1, S: 1, O: 4.5, H: 1 }],
  ['Na2CO3·10H2O·2H2O2', { Na: 2, C: 1, O: 17, H: 24 }],
  ['Fe0.947O', { Fe: 0.947, O: 1 }],
  ['(Fe0.1O)3', { Fe: 0.3, O: 3 }],
])('%s holds its atoms', (text, atoms) => {
  expect(atomsOf(text)).toEqual(atoms);
});

test('words that are element symbols are told apart by their capitals', () => {
  expect(atomsOf('Co')).toEqual({ Co: 1 });
  expect(atomsOf('CO')).toEqual({ C: 1, O: 1 });
  expect(atomsOf('HNO')).toEqual({ H: 1, N: 1, O: 1 });
});

describe('a text that is no formula', () => {
  test.each([
    'Na(',
    'Na)',
    '(Na]',
    '()',
    'Na2(',
    'Na0',
    'Na00',
    'Na01',
    'Na1234567',
    'Na?',
    '·H2O',
    'Na··O',
    'Na·1/0H2O',
    'Na1.5.',
    '',
  ])('%s is an error that names the place', (text) => {
    expect(messageOf('formula-unreadable', () => parseFormula(text))).toMatch(/at character \d+/);
  });

  test('an unknown element is named with its place', () => {
    expect(messageOf('element-unknown', () => parseFormula('Na2Xy3'))).toContain(
      'Xy, at character 4 of "Na2Xy3"',
    );
  });

  test.each(['D2O', 'T2', '[13C]H4', 'CD3OH'])('%s is refused as an isotope', (text) => {
    expect(messageOf('isotope', () => parseFormula(text))).toContain('H for D and T');
  });

  test('brackets beyond any chemistry are refused, however many', () => {
    expect(() => parseFormula('('.repeat(100))).toThrow('20 deep');
  });
});

/** Random formulas with the counts that they ought to have, made side by side. */
const elements = fc.constantFrom(...ATOMIC_WEIGHTS.keys());
const units = fc.letrec<{ unit: [string, Map<string, number>] }>((tie) => ({
  unit: fc.oneof(
    { depthSize: 'small', maxDepth: 4 },
    elements.map((symbol): [string, Map<string, number>] => [symbol, new Map([[symbol, 1]])]),
    fc
      .tuple(
        fc.array(fc.tuple(tie('unit'), fc.integer({ min: 1, max: 12 })), { minLength: 1, maxLength: 3 }),
        fc.boolean(),
      )
      .map(([parts, isSquare]): [string, Map<string, number>] => {
        const inside = joined(parts);
        return [isSquare ? `[${inside[0]}]` : `(${inside[0]})`, inside[1]];
      }),
  ),
})).unit;

function joined(parts: [[string, Map<string, number>], number][]): [string, Map<string, number>] {
  const atoms = new Map<string, number>();
  let text = '';
  for (const [[unit, held], count] of parts) {
    text += unit + (count === 1 ? '' : String(count));
    for (const [symbol, n] of held) atoms.set(symbol, (atoms.get(symbol) ?? 0) + n * count);
  }
  return [text, atoms];
}

test('a random formula holds the atoms that it was made of, and prints as it was written', () => {
  const formulas = fc
    .array(fc.tuple(units, fc.integer({ min: 1, max: 12 })), { minLength: 1, maxLength: 4 })
    .map(joined);
  fc.assert(
    fc.property(formulas, ([text, atoms]) => {
      expect(new Map(Object.entries(atomsOf(text)))).toEqual(atoms);
      expect(parseFormula(text).text).toBe(text);
    }),
    { seed: 31 },
  );
});
