/**
 * Any text at all: it is read, or it is an error of the input, in a time that grows with its length.
 */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { balanceEquation } from '../../../functions/chemistry/balance.ts';
import { balancedEquation } from '../../../functions/chemistry/balancedEquation.ts';
import { parseEquation } from '../../../functions/chemistry/equation.ts';
import { matchSpecies } from '../../../functions/chemistry/match.ts';
import { parseSpecies } from '../../../functions/chemistry/species.ts';
import { readUnit } from '../../../functions/chemistry/units/readUnit.ts';
import { isInputError } from '../../../functions/errors.ts';

const species = fc.constantFrom(
  ...'N2(g) NH3 Na+ SO4^2- HCO3-(aq) e^- CuSO4·5H2O CaSO4·1/2H2O CaCO3(s,calcite) Fe0.947O I3^- A HA A^2-'.split(
    ' ',
  ),
  ...'[Fe(CN)6]^4- ester n-butane (NH4)2SO4 UO2.67 UO2.67+ Y1.50Ba2 Ca(OH)2 H3O+ OH- edta^4- Water'.split(
    ' ',
  ),
  'acetic acid(l)',
);
const coefficients = fc.oneof(
  fc.constant(''),
  fc.integer({ min: 1, max: 99 }).map((n) => `${n} `),
  fc.tuple(fc.integer({ min: 1, max: 9 }), fc.integer({ min: 2, max: 9 })).map(([a, b]) => `${a}/${b} `),
  fc.integer({ min: 1, max: 999 }).map((n) => `${n / 100} `),
);
const terms = fc.tuple(coefficients, species).map((pair) => pair.join(''));
const equations = fc
  .tuple(
    fc.uniqueArray(terms, { minLength: 2, maxLength: 6, selector: (term) => term.replace(/^[\d./]+ /, '') }),
    fc.integer({ min: 1, max: 5 }),
    fc.constantFrom(' + ', '+', ' +', '+ '),
    fc.constantFrom(' = ', '=', ' -> ', ' <=> '),
  )
  .filter(([all, at]) => at < all.length)
  .map(([all, at, plus, sign]) => all.slice(0, at).join(plus) + sign + all.slice(at).join(plus));

test('an equation is read the same with spaces and without, and its canonical text is a fixed point', () => {
  fc.assert(
    fc.property(equations, (text) => {
      const reaction = parseEquation(text);
      const again = parseEquation(reaction.text);
      expect(again.text).toBe(reaction.text);
      expect(again.stoichiometry).toEqual(reaction.stoichiometry);
      expect(parseEquation(text.replace(/(?<=[^+ ])\+(?=[^+ =])/g, ' + ').replaceAll('  ', ' ')).text).toBe(
        reaction.text,
      );
    }),
    { seed: 61, numRuns: 500 },
  );
});

/** Texts near enough to chemistry to get past the first check. */
const garbage = fc.oneof(
  fc.string({ unit: 'grapheme', maxLength: 60 }),
  fc
    .array(
      fc.constantFrom(
        ...'Na Cl H 2 3 . · ^ + - ( ) [ ] = -> , / 0 as % e g aq Nm3 degC K mol ²⁺ ₂'.split(' '),
        ' ',
      ),
      {
        maxLength: 40,
      },
    )
    .map((pieces) => pieces.join('')),
);

const readers: [string, (text: string) => unknown][] = [
  ['species', parseSpecies],
  ['equation', parseEquation],
  ['balanced equation', balancedEquation],
  ['balance', balanceEquation],
  ['label', (text) => matchSpecies(parseEquation('N2(g) + 3 H2(g) = 2 NH3(g)'), text)],
  ['unit', readUnit],
];

test.each(readers)('any text for a %s is read or is an error of the input', (_, read) => {
  fc.assert(
    fc.property(garbage, (text) => {
      try {
        read(text);
      } catch (thrown) {
        if (!isInputError(thrown)) throw thrown;
        expect(thrown.message).not.toMatch(/undefined|\{\w+\}/);
      }
    }),
    { seed: 62, numRuns: 1500 },
  );
});

test('what is read of any species text has a canonical text that reads back as the same', () => {
  fc.assert(
    fc.property(garbage, (text) => {
      let one;
      try {
        one = parseSpecies(text);
      } catch {
        return;
      }
      expect(parseSpecies(one.text)).toEqual(one);
    }),
    { seed: 63, numRuns: 3000 },
  );
});

// A pattern that goes back over its text would need minutes for the longest of these; the bound
// leaves room for a busy machine.
const MOST_MILLISECONDS = 1000;

test.each(readers)('no long text keeps the reader of a %s', (_, read) => {
  const pieces = [
    '(',
    '[',
    'a ',
    'A+',
    '+ ',
    ' ',
    '(s,',
    '1/',
    '1.',
    '.1',
    '·',
    '^',
    '⁺',
    'm/',
    'Na(',
    'l',
    'a-',
    '=',
  ];
  for (const piece of pieces) {
    for (const length of [110, 900, 100_000]) {
      const text = piece.repeat(Math.ceil(length / piece.length));
      const start = performance.now();
      try {
        read(text);
      } catch (thrown) {
        if (!isInputError(thrown)) throw thrown;
        expect(thrown.message.length).toBeLessThan(2500);
      }
      expect(performance.now() - start, `${piece} x ${length}`).toBeLessThan(MOST_MILLISECONDS);
    }
  }
});
