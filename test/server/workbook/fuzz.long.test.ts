import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { isInputError } from '../../../functions/errors.ts';
import { formulaTokens } from '../../../server/workbook/formulaTokens.ts';
import { nameTable, prepareFormula } from '../../../server/workbook/prepareFormula.ts';
import { formulaLike } from './formulaText.ts';
import { expectWorkbookOrProblems } from './holdsTogether.ts';
import { yamlLike } from './yamlTexts.ts';

const RUNS = 20_000;

describe('twenty thousand texts', () => {
  it('are workbooks or have coded problems', () => {
    fc.assert(
      fc.property(yamlLike, (text) => void expectWorkbookOrProblems(text)),
      { seed: 7, numRuns: RUNS },
    );
  });

  it('are formulas for the engine or are refused with a code', () => {
    const names = nameTable({ charge: 'Kettle!$A$1:$B$2' });
    fc.assert(
      fc.property(formulaLike, (formula) => {
        expect(
          formulaTokens(formula)
            .map(({ text }) => text)
            .join(''),
        ).toBe(formula);
        try {
          prepareFormula(formula, names);
        } catch (error) {
          expect(isInputError(error)).toBe(true);
        }
      }),
      { seed: 8, numRuns: RUNS },
    );
  });
});
