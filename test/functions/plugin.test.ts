/** Functions of the analyst's own, and what the plugin does where a function is at fault. */
import * as hyperformula from 'hyperformula';
import { describe, expect, it } from 'vitest';
import { defineFunction, number, repeated } from '../../functions/index.ts';
import { registerEvenkeel } from '../../functions/plugin.ts';
import { Host } from '../../server/engine/host.ts';
import { INSTANT, workbookWith } from '../server/engine/hostOf.ts';

const plain = { summary: 'For this test.', gives: 'a number', examples: [] } as const;
const half = defineFunction({
  ...plain,
  name: 'TEST.HALF',
  parameters: { value: number('any') },
  run: ({ value }) => ({ value: value / 2, unit: 'kg' }),
});
const broken = defineFunction({
  ...plain,
  name: 'TEST.BROKEN',
  parameters: {},
  run: () => {
    throw new TypeError('of its own making');
  },
});
const endless = defineFunction({
  ...plain,
  name: 'TEST.ENDLESS',
  parameters: {},
  run: () => ({ value: Infinity }),
});
const tooLarge = defineFunction({
  ...plain,
  name: 'TEST.TOO.LARGE',
  parameters: {},
  shape: () => ({ rows: 1, columns: 2 }),
  run: () => ({ value: [[1, 2, 3]] }),
});
const total = defineFunction({
  ...plain,
  name: 'TEST.TOTAL',
  parameters: { addend: repeated(number('any')) },
  run: ({ addend }) => ({ value: addend.reduce((sum, value) => sum + value, 0) }),
});
const OWN = { file: 'plant.mjs', sha256: 'abc', functions: [half, broken, endless, tooLarge, total] };

const hostWith = (cells: Record<string, string | number>) =>
  new Host(workbookWith(cells), { ownFunctions: OWN, instant: INSTANT });

describe('an own function', () => {
  it('works in a cell, with its unit and its file in the evaluation', () => {
    const evaluation = hostWith({ A1: '=TEST.HALF(3)' }).evaluate();
    expect(evaluation.sheets.S).toEqual([[1.5]]);
    expect(evaluation.formulas['S!A1']!.answers).toEqual([
      { function: 'TEST.HALF', unit: 'kg', outcome: null },
    ]);
    expect(evaluation.versions.ownFunctions).toEqual({ file: 'plant.mjs', sha256: 'abc' });
  });

  it('takes repeated arguments one by one', () => {
    expect(hostWith({ A1: '=TEST.TOTAL(1, 2, 3.5)' }).values('S!A1')).toBe(6.5);
    expect(hostWith({ A1: '=TEST.TOTAL(1, "b")' }).values('S!A1')).toMatchObject({
      error: 'argument-kind',
      message: expect.stringContaining('addend 2 is the text "b"') as string,
    });
  });

  it.each(['TEST.BROKEN', 'TEST.ENDLESS'])(
    'at fault says so, and other cells keep their values: %s',
    (name) => {
      const host = hostWith({ A1: `=${name}()`, A2: '=A1+1', A3: '=1+1' });
      expect(host.values('S!A1')).toMatchObject({ error: 'function-failed' });
      expect(host.values('S!A2')).toMatchObject({ error: 'function-failed' });
      expect(host.values('S!A3')).toBe(2);
    },
  );

  it('whose answer has another size than it declares is an error', () => {
    expect(hostWith({ A1: '=TEST.TOO.LARGE()' }).values('S!A1')).toMatchObject({
      error: 'table-lies-otherwise',
    });
  });

  it('cannot take a name that is taken', () => {
    const taken = { ...half, name: 'EXTENT.SOLVE' };
    expect(() => registerEvenkeel(hyperformula, [taken])).toThrow(
      expect.objectContaining({ code: 'function-name-taken' }) as Error,
    );
  });

  it('may be registered again', () => {
    expect(() => registerEvenkeel(hyperformula, OWN.functions)).not.toThrow();
  });
});
