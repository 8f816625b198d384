import { describe, expect, it } from 'vitest';
import { evaluateWorkbook } from '../../../server/engine/evaluateWorkbook.ts';
import { withTimeLimit } from '../../../server/engine/timeLimit.ts';
import { workbookWith } from './hostOf.ts';

describe('withTimeLimit', () => {
  it('gives what the work gives', () => {
    expect(withTimeLimit(5, 'work', () => [1, 2])).toEqual([1, 2]);
  });

  it('passes on what the work throws', () => {
    expect(() =>
      withTimeLimit(5, 'work', () => {
        throw new Error('of its own');
      }),
    ).toThrow('of its own');
  });

  it('ends a loop that catches everything', () => {
    const stubborn = () => {
      for (;;) {
        try {
          for (;;);
        } catch {
          continue;
        }
      }
    };
    expect(() => withTimeLimit(0.05, 'loop.yaml', stubborn)).toThrow(
      'loop.yaml was not evaluated within 0.05 s',
    );
  });
});

describe('an evaluation', () => {
  const BOMB = workbookWith({ A1: '=SUM(SEQUENCE(30000, 1000))', A2: '=REPT("ab", 1E9)' });

  it('that takes too long ends with the name of the workbook', () => {
    expect(() => evaluateWorkbook(BOMB, { timeLimitSeconds: 0.3 })).toThrow(
      'case.yaml was not evaluated within 0.3 s',
    );
  });

  it('is as before after one that was ended', () => {
    expect(() => evaluateWorkbook(BOMB, { timeLimitSeconds: 0.3 })).toThrow();
    const evaluation = evaluateWorkbook(workbookWith({ A1: '=1+1' }));
    expect(evaluation.sheets.S).toEqual([[2]]);
  });

  it('is frozen to its innermost part', () => {
    const { formulas } = evaluateWorkbook(workbookWith({ A1: '=EXTENT.SOLVE("A = B", 1, {1;0})' }));
    expect(Object.isFrozen(formulas['S!A1']!.answers[0]!.outcome!.problem)).toBe(true);
  });

  it('survives JSON without loss', () => {
    const evaluation = evaluateWorkbook(
      workbookWith({ A1: '=EXTENT.SOLVE("A = B", 1E-300, {1;0})', A2: '=1/0' }),
    );
    expect(JSON.parse(JSON.stringify(evaluation))).toEqual(evaluation);
  });

  it('of the same workbook is the same, bit for bit', () => {
    const workbook = workbookWith({ A1: '=EXTENT.SOLVE("A + 2 B = C", 7.3, {1;2.2;0})', A2: '=EXP(A1)' });
    expect(JSON.stringify(evaluateWorkbook(workbook))).toBe(JSON.stringify(evaluateWorkbook(workbook)));
  });
});
