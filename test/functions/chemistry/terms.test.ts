import { expect, test } from 'vitest';
import { splitTerms } from '../../../functions/chemistry/terms.ts';

test.each([
  ['A+B', ['A', 'B']],
  ['A +B', ['A', 'B']],
  ['A+ 2 B', ['A', '2 B']],
  ['A+2B', ['A', '2B']],
  ['A+(NH4)2SO4', ['A', '(NH4)2SO4']],
  ['Na+ + Cl-', ['Na+', 'Cl-']],
  ['Na++Cl-', ['Na+', 'Cl-']],
  ['Na+ +Cl-', ['Na+', 'Cl-']],
  ['2H+ + 2e^-', ['2H+', '2e^-']],
  ['Ca^2++2Cl-', ['Ca^2+', '2Cl-']],
  ['Ca^+2+2Cl-', ['Ca^+2', '2Cl-']],
  ['Ca+2 + SO4-2', ['Ca+2', 'SO4-2']],
  ['Ca+2+SO4-2', ['Ca+2', 'SO4-2']],
  ['e^-+Fe^3+', ['e^-', 'Fe^3+']],
  ['Na+(aq) + H+ (aq)+Cl-(aq)', ['Na+(aq)', 'H+ (aq)', 'Cl-(aq)']],
  ['Na+', ['Na+']],
  ['A +', ['A', '']],
  ['A + + B', ['A', '', 'B']],
  ['+ A', ['', 'A']],
])('%s has the terms %j', (side, terms) => {
  expect(splitTerms(side)).toEqual(terms);
});
