/** The README's blocks run, and its first result is what it says. */
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { catalogue } from '../../functions/catalogue.ts';
import { root } from '../../scripts/root.mjs';
import { evaluateWorkbook } from '../../server/engine/evaluateWorkbook.ts';
import { readYamlWorkbook } from '../../server/workbook/yaml.ts';

const README = readFileSync(`${root}/README.md`, 'utf8');

/** The code blocks of one language, in order. */
function blocks(language: string): string[] {
  return [...README.matchAll(/^```(\w*)\n([^]*?)^```$/gm)]
    .filter(([, tag]) => tag === language)
    .map(([, , text]) => text!);
}

describe('the README', () => {
  it('opens with one paragraph that states the job', () => {
    const [title, paragraph, next] = README.split('\n\n');
    expect(title).toBe('# Evenkeel');
    expect(paragraph!.split('\n')).toHaveLength(1);
    expect(next).toMatch(/local codes/);
  });

  it.each(blocks('yaml'))('shows a workbook that evaluates and passes its checks', (text) => {
    const evaluation = evaluateWorkbook(readYamlWorkbook(Buffer.from(text), 'readme.yaml'));
    expect(evaluation.problems).toEqual([]);
    expect(evaluation.checks.map(({ passed }) => passed)).toEqual([true]);
    // By hand: x (x + 0.4) = 4.1 (2 - x)(3 - x), so 3.1 x^2 - 20.9 x + 24.6 = 0.
    const root = (20.9 - Math.sqrt(20.9 * 20.9 - 4 * 3.1 * 24.6)) / 6.2;
    expect(evaluation.outputs.extent!.value).toBeCloseTo(root, 13);
  });

  it('names only functions and families that exist', () => {
    const names = catalogue.map(({ name }) => name);
    const shown = [...README.matchAll(/\b[A-Z]+(?:\.[A-Z]+)+\b/g)].map(([name]) => name);
    const unknown = shown.filter((name) => !names.includes(name) && !name.startsWith('PLANT.'));
    expect(unknown).toEqual([]);
    for (const [, family] of README.matchAll(/`([A-Z]+\.)`/g)) {
      expect(names.some((name) => name.startsWith(family!))).toBe(true);
    }
  });
});
