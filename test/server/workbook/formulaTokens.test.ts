import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formulaTokens } from '../../../server/workbook/formulaTokens.ts';
import { formulaLike } from './formulaText.ts';

function kinds(formula: string): string[] {
  return formulaTokens(formula).map(({ kind, text }) => `${kind} ${text}`);
}

describe('the tokens of a formula', () => {
  it('are its text when they are joined', () => {
    fc.assert(
      fc.property(formulaLike, (formula) => {
        const tokens = formulaTokens(formula);
        expect(tokens.map(({ text }) => text).join('')).toBe(formula);
      }),
      { seed: 2, numRuns: 500 },
    );
  });

  it('tell cells, functions, names and numbers apart', () => {
    expect(kinds('=LOG10(LOG10+1E5+T.INV (K_1))')).toEqual([
      'operator =',
      'function LOG10',
      'open (',
      'cell LOG10',
      'operator +',
      'number 1E5',
      'operator +',
      'function T.INV',
      'space  ',
      'open (',
      'name K_1',
      'close )',
      'close )',
    ]);
  });

  it.each([
    ["'Feed tank'!$A:B", 'columns'],
    ['1:$3', 'rows'],
    ["'It''s'!B$2", 'cell'],
    ['1E5!A1', 'cell'],
    ['"say ""A1"""', 'text'],
    ['#DIV/0!', 'error'],
    ['ZZZ1', 'name'],
    ['A1048577', 'name'],
    ['é_1', 'name'],
    ['"unclosed', 'unknown'],
    ["'not a sheet'", 'unknown'],
    ['2A1', 'unknown'],
    ['−', 'unknown'],
  ])('take %s for one token of kind %s', (text, kind) => {
    expect(formulaTokens(text)).toEqual([{ kind, text }]);
  });

  // Worst cases for a scan that looks for a closing quote or a `!` again and again.
  it.each(["='", "''", '"a', '1.', 'a!', 'A', 'A1', 'a (', ' ', 'A:', '1:', "'a"])(
    'are found in time that grows with the length: %j',
    (piece) => {
      const formula = piece.repeat(200_000 / piece.length);
      const begin = performance.now();
      formulaTokens(formula);
      // 0.1 to 0.4 s were measured; a quadratic scan takes minutes.
      expect(performance.now() - begin).toBeLessThan(5000);
    },
  );
});
