import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { expectWorkbookOrProblems } from './holdsTogether.ts';
import { yamlLike } from './yamlTexts.ts';

describe('any text', () => {
  it('is a workbook that fits the published schema, or has problems with codes and places', () => {
    const found = { workbook: 0, problems: 0 };
    fc.assert(
      fc.property(yamlLike, (text) => {
        found[expectWorkbookOrProblems(text)] += 1;
      }),
      { seed: 6, numRuns: 600 },
    );
    expect(Math.min(found.workbook, found.problems)).toBeGreaterThan(50);
  }, 30_000);
});
