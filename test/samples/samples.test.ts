/** Every sample is sound, and says that it is invented. */
import { describe, expect, it } from 'vitest';
import { isFormula } from '../../server/workbook/model.ts';
import { evaluated, sample, sampleFiles, valuesOf } from './sample.ts';

const FEWEST_CHECKS = 3;

it('there are samples of a kettle, a converter, a closed vessel, a log of readings and of traps', () => {
  const wanted = ['closedVessel.yaml', 'converter.yaml', 'kettle.yaml', 'reactorLog.yaml', 'traps.yaml'];
  expect(sampleFiles).toEqual(expect.arrayContaining(wanted));
});

describe.each(sampleFiles)('%s', (file) => {
  const workbook = sample(file);
  const evaluation = evaluated(file);

  it('says that its scenario is invented', () => expect(workbook.about).toMatch(/invented/i));

  it('evaluates without an error in any cell', () => expect(evaluation.problems).toEqual([]));

  it('passes all of its checks, of which it has three or more', () => {
    expect(evaluation.checks.length).toBeGreaterThanOrEqual(FEWEST_CHECKS);
    expect(evaluation.checks.filter(({ passed }) => !passed)).toEqual([]);
  });

  it('has inputs with limits, which hold their values', () => {
    expect(workbook.inputs.length).toBeGreaterThan(0);
    for (const [name, { value, min, max }] of Object.entries(evaluation.inputs)) {
      expect(value, name).toBeTypeOf('number');
      expect(value, name).toBeGreaterThanOrEqual(min!);
      expect(value, name).toBeLessThanOrEqual(max!);
    }
  });

  it('gives a finite number or a word in every output', () => {
    for (const [name, output] of Object.entries(evaluation.outputs)) {
      for (const value of valuesOf(output)) {
        if (typeof value === 'number') expect(Number.isFinite(value), name).toBe(true);
        else expect(value, name).toBeTypeOf('string');
      }
    }
  });

  it('raises nothing to a power by ^, which differs between versions of Node in the last bit', () => {
    const formulas = workbook.sheets.flatMap(({ rows }) => rows.flat().filter(isFormula));
    expect(formulas.filter(({ formula }) => formula.replace(/"[^"]*"/g, '').includes('^'))).toEqual([]);
  });
});
