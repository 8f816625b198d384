/**
 * Formulas made at random from our functions and all manner of arguments, many of them nonsense.
 */
import fc from 'fast-check';
import { expect } from 'vitest';
import { catalogue } from '../../../functions/catalogue.ts';
import { evaluateWorkbook } from '../../../server/engine/evaluateWorkbook.ts';
import { isError, type Value } from '../../../server/evaluation.ts';
import { workbookWith } from './hostOf.ts';

const FORMULAS_A_SHEET = 50;
/** Formulas stand so far apart that their array answers do not meet. */
const ROWS_APART = 20;
const BLOCK_COLUMN = 'H';

/** What the cells beside the formulas hold: a good table, a table with faults, conditions, an error, blanks. */
const CELLS = {
  A1: 'species',
  B1: 'amount',
  C1: 'unit',
  D1: 'standard uncertainty',
  A2: 'N2(g)',
  B2: 1,
  C2: 'mol',
  D2: 0.01,
  A3: 'H2(g)',
  B3: 3,
  C3: 'mol',
  A4: 'NH3(g)',
  B4: 0,
  C4: 'mol',
  A5: 'Ar',
  B5: 0.1,
  C5: 'mol',
  A7: 'N2(g)',
  B7: -1,
  C7: 'furlong',
  A8: 'H2',
  B8: 'three',
  C8: 7,
  A9: '__proto__',
  B9: true,
  A11: 'pressure',
  B11: 200,
  C11: 'bar',
  A12: 'temperature',
  B12: 700,
  C12: 'K',
  A14: 'constructor',
  B14: 1,
  A15: 'pressure',
  B15: 1,
  A16: 'medium',
  B16: 'aether',
  F1: '=1/0',
} as const;

const equation = fc.oneof(
  fc.constantFrom(
    'N2(g) + 3 H2(g) = 2 NH3(g)',
    'A + B = 2 C',
    'CaCO3(s) = CaO(s) + CO2(g)',
    'N2 + H2 = NH3',
    'Fe3+ + Cl- = FeCl^2+',
    '__proto__ = constructor',
    'A = A',
    '= B',
    'D2O = H2O',
    'Xx2 + 3 Yy = Z',
    '1/0 A = B',
    '(((((A = B',
  ),
  fc.string({ maxLength: 40 }),
  fc.string({ unit: fc.constantFrom(...'ABCHNO()[]+-=^ 0123456789./·⇌(g)'.split('')), maxLength: 60 }),
);

const quoted = (text: fc.Arbitrary<string>) => text.map((t) => `"${t.replaceAll('"', '""')}"`);

const argument = fc.oneof(
  { weight: 3, arbitrary: quoted(equation) },
  { weight: 3, arbitrary: fc.constantFrom('A1:C4', 'A1:D5', 'A2:C4', 'B2:B4', 'A11:C12') },
  {
    weight: 2,
    arbitrary: fc.constantFrom('A7:C9', 'A14:B16', 'F1', 'A1:F5', 'E1', 'E1:E3', 'A:A', 'ZZ90:ZZ99'),
  },
  { weight: 2, arbitrary: fc.double().map((n) => (Number.isFinite(n) ? `(${n})` : '1E308')) },
  {
    weight: 1,
    arbitrary: fc.constantFrom('0', '-1', '1E-300', '1E300', '4.1', 'TRUE', '', '""', '{1;3;0}', '{1,"a"}'),
  },
  {
    weight: 1,
    arbitrary: quoted(
      fc.constantFrom('mol', 'K', 'degC', 'bar', 'g', 'status', 'pressure bar', 'Nm3', 'ppm'),
    ),
  },
);

const call = (inner: fc.Arbitrary<string>) =>
  fc
    .tuple(fc.constantFrom(...catalogue.map(({ name }) => name)), fc.array(inner, { maxLength: 7 }))
    .map(([name, given]) => `${name}(${given.join(',')})`);

const nested = call(fc.oneof({ weight: 5, arbitrary: argument }, { weight: 1, arbitrary: call(argument) }));

const formula = fc.oneof(
  { weight: 6, arbitrary: nested },
  { weight: 1, arbitrary: nested.map((inner) => `IFERROR(${inner},${inner})*2+SUM(${inner})`) },
  { weight: 1, arbitrary: fc.tuple(nested, fc.nat(60)).map(([text, cut]) => text.slice(0, cut)) },
  { weight: 1, arbitrary: fc.string({ maxLength: 60 }) },
);

/** Works that many formulas; none may break out of the host, hang, or give an error without code and remedy. */
export function fuzzFormulas(count: number, seed: number): void {
  const sheet = fc.array(formula, { minLength: FORMULAS_A_SHEET, maxLength: FORMULAS_A_SHEET });
  fc.assert(
    fc.property(sheet, (formulas) => {
      const cells = formulas.map((text, i) => [`${BLOCK_COLUMN}${1 + i * ROWS_APART}`, `=${text}`] as const);
      const evaluation = evaluateWorkbook(workbookWith({ ...CELLS, ...Object.fromEntries(cells) }));
      expect(evaluation.sheets.S!.flat().filter((value) => !isWellFormed(value))).toEqual([]);
      const text = JSON.stringify(evaluation);
      expect(JSON.stringify(JSON.parse(text))).toBe(text);
    }),
    { numRuns: Math.ceil(count / FORMULAS_A_SHEET), seed, endOnFailure: true },
  );
}

/** Numbers are finite; errors have a code of a table and a message without gaps. */
function isWellFormed(value: Value): boolean {
  if (typeof value === 'number') return Number.isFinite(value);
  if (!isError(value)) return true;
  const hasGap = /undefined|\{\w+\}|\[object|NaN/.test(value.message);
  return /^[a-z][a-z0-9-]+$/.test(value.error) && value.error !== 'function-failed' && !hasGap;
}
