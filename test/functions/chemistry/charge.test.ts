import fc from 'fast-check';
import { expect, test } from 'vitest';
import { printCharge, splitCharge } from '../../../functions/chemistry/charge.ts';
import { messageOf } from '../raises.ts';

test.each([
  ['Ca^2+', 'Ca', 2],
  ['Ca^+2', 'Ca', 2],
  ['Ca+2', 'Ca', 2],
  ['SO4-2', 'SO4', -2],
  ['K+1', 'K', 1],
  ['Na+', 'Na', 1],
  ['Na^+', 'Na', 1],
  ['HCO3-', 'HCO3', -1],
  ['B(OH)4-', 'B(OH)4', -1],
  ['(CH3)4N+', '(CH3)4N', 1],
  ['I3^-', 'I3', -1],
  ['C60-', 'C60', -1],
  ['UO2.5+', 'UO2.5', 1],
  ['[Fe(CN)6]^4-', '[Fe(CN)6]', -4],
  ['acetate-', 'acetate', -1],
  ['e^-', 'e', -1],
  ['H2O', 'H2O', null],
  ['r-22', 'r-22', null],
])('%s is %s with charge %s', (text, body, charge) => {
  expect(splitCharge(text)).toEqual({ body, charge });
});

test.each([
  ['Fe3+', 'Fe3^+', 'Fe^3+'],
  ['I3-', 'I3^-', 'I^3-'],
  ['SO42-', 'SO42^-', 'SO4^2-'],
  ['Hg22+', 'Hg22^+', 'Hg2^2+'],
  ['[Fe(CN)6]3-', '[Fe(CN)6]3^-', '[Fe(CN)6]^3-'],
  ['(H2O)2+', '(H2O)2^+', '(H2O)^2+'],
  ['edta4-', 'edta4^-', 'edta^4-'],
])('%s is an error that shows both %s and %s', (text, first, second) => {
  const message = messageOf('formula-two-readings', () => splitCharge(text));
  expect(message).toContain(`as ${first} or as ${second}`);
  expect(splitCharge(second)).not.toEqual(splitCharge(first));
});

test.each(['Ca^2', 'Ca^', 'Ca^0+', 'Ca^2+-', 'Ca^++', 'Ca^x+', 'Ca^123+', 'Ca^2+^2+'])(
  '%s has no readable charge',
  (text) => {
    expect(messageOf('charge-unreadable', () => splitCharge(text))).toContain('Ca^2+');
  },
);

test.each(['^13CO2', 'H2^18O', 'C^2H4'])('a mass number is refused in %s', (text) => {
  expect(messageOf('isotope', () => splitCharge(text))).toContain(text);
});

test('a printed charge reads back as the same', () => {
  const bodies = fc.constantFrom(
    'Na',
    'I3',
    'HCO3',
    'SO4',
    'C60',
    '[Fe(CN)6]',
    '(H2O)2',
    'e',
    'edta',
    'UO2.5',
  );
  fc.assert(
    fc.property(bodies, fc.integer({ min: -12, max: 12 }), (body, charge) => {
      expect(splitCharge(body + printCharge(body, charge))).toEqual({
        body,
        charge: charge === 0 ? null : charge,
      });
    }),
    { seed: 41 },
  );
});
