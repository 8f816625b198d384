/**
 * Each finding about the engine (HyperFormula 3.5.0) that the host answers. A test that fails after
 * an upgrade says which finding has changed.
 */
import * as hyperformula from 'hyperformula';
import { describe, expect, it } from 'vitest';
import { catalogue } from '../../../functions/catalogue.ts';
import { registerEvenkeel } from '../../../functions/plugin.ts';
import { hostOf, INSTANT } from './hostOf.ts';

const INPUT = { unit: null, min: null, max: null, uncertainty: null };
const RAW = { licenseKey: 'gpl-v3' } as const;

describe('numbers', () => {
  it('keep all their digits, which the defaults of the engine would round away', () => {
    const rounded = hyperformula.HyperFormula.buildFromArray([['=1/3', '=1E-15*1']], RAW);
    expect(rounded.getCellValue({ sheet: 0, row: 0, col: 0 })).toBe(0.33333333333);
    const host = hostOf({ A1: '=1/3', A2: '=0.1+0.2-0.3', A3: '=3.3E-15/3' });
    expect(host.values('S!A1')).toBe(1 / 3);
    expect(host.values('S!A2')).toBe(0.1 + 0.2 - 0.3);
    expect(host.values('S!A3')).toBe(3.3e-15 / 3);
  });

  it('include the circle constant to its last digit', () => {
    expect(hostOf({ A1: '=PI()' }).values('S!A1')).toBe(Math.PI);
  });

  it('are read with an upper-case exponent', () => {
    expect(hostOf({ A1: '=1E-14' }).values('S!A1')).toBe(1e-14);
    expect(hostOf({ A1: '="1E-14"&"x"' }).values('S!A1')).toBe('1E-14x');
  });
});

describe('texts', () => {
  it('keep their meaning where the engine would make numbers and dates of them', () => {
    const host = hostOf({
      A1: '50%',
      A2: '1/2/2024',
      A3: '7',
      A4: "'quoted",
      B1: '=ISTEXT(A1)',
      B3: '=ISTEXT(A3)',
    });
    expect(['A1', 'A2', 'A3', 'A4'].map((cell) => host.values(`S!${cell}`))).toEqual([
      '50%',
      '1/2/2024',
      '7',
      "'quoted",
    ]);
    expect([host.values('S!B1'), host.values('S!B3')]).toEqual([true, true]);
  });

  it('with doubled quotes, and TRUE without brackets, are read in formulas', () => {
    const host = hostOf({ A1: '="a ""b"" c"', A2: '=IF(TRUE, 1, 2)', A3: '=SUM (1, 2)' });
    expect(host.values('S!A1:A3')).toEqual([['a "b" c'], [1], [3]]);
  });
});

describe('errors', () => {
  it('of our functions keep their code, and dependents point at the cell where they began', () => {
    const host = hostOf({ A1: '=REACTION.CHECK("N2 + H2 = NH3")', A2: '=A1', A3: '=A2' });
    expect(host.values('S!A3')).toMatchObject({ error: 'equation-unbalanced' });
    expect(host.evaluate().problems.map(({ cell }) => cell)).toEqual(['S!A1']);
  });

  it('inside a range argument come through as they are', () => {
    const host = hostOf({ A1: 1, A2: '=1/0', A3: 2, B1: '=REACTION.QUOTIENT("A + B = C", A1:A3)' });
    expect(host.values('S!B1')).toMatchObject({ error: 'division-by-zero' });
    expect(host.evaluate().problems.map(({ cell }) => cell)).toEqual(['S!A2']);
  });

  it('of a formula that cannot be parsed stay in their cell, and dependents point there', () => {
    const host = hostOf({ A1: '=(1', A2: '=A1+1', A3: '=2+2' });
    expect(host.values('S!A3')).toBe(4);
    expect(host.evaluate().problems).toMatchObject([{ cell: 'S!A1', code: 'formula-unparsed' }]);
  });

  it('of nesting that would overflow the stack of the engine are told before it is built', () => {
    const host = hostOf({ A1: `=${'('.repeat(2000)}1${')'.repeat(2000)}`, A2: '=A1', A3: '=1+1' });
    expect(host.values('S!A3')).toBe(2);
    expect(host.evaluate().problems).toMatchObject([{ cell: 'S!A1', code: 'formula-too-deep' }]);
  });

  it('are told for a function that is not known', () => {
    const values = (formula: string) => hostOf({ A1: formula }).values('S!A1');
    expect(values('=NO.SUCH(1)')).toEqual({
      error: 'unknown-function',
      message: 'there is no function NO.SUCH. Check its spelling. `evenkeel functions` lists ours.',
    });
    expect(values('=EXTENT.SLOVE(1)')).toMatchObject({
      message: expect.stringContaining('EXTENT.SLOVE. Did you mean EXTENT.SOLVE?') as string,
    });
  });

  it('are told for a cycle, for a lost sheet and for an array answer without room', () => {
    const host = hostOf({
      A1: '=A2',
      A2: '=A1',
      B1: '=NoSheet!A1',
      C1: '=TRANSPOSE(D1:E1)',
      C2: 5,
      D1: 1,
      E1: 2,
    });
    expect(host.values('S!A1')).toMatchObject({ error: 'cycle' });
    expect(host.values('S!B1')).toMatchObject({ error: 'reference-lost' });
    expect(host.values('S!C1')).toMatchObject({ error: 'array-blocked' });
  });
});

describe('array answers', () => {
  const CELLS = { A1: 1, A2: 1, A3: 0, B1: '=COMPOSITION.AT.EQUILIBRIUM("A + B = 2 C", 4, A1:A3)' };

  it('take up the cells that their table has', () => {
    const host = hostOf(CELLS);
    expect(host.values('S!B1:B3')).toEqual([[0.5], [0.5], [1]]);
    expect(host.evaluate().formulas['S!B1']!.lastCell).toBe('S!B3');
  });

  it('are worked on cell by cell by operators', () => {
    const host = hostOf({ ...CELLS, D1: '=COMPOSITION.AT.EQUILIBRIUM("A + B = 2 C", 4, A1:A3)*2' });
    expect(host.values('S!D1:D3')).toEqual([[1], [1], [2]]);
  });

  it('are worked on from ranges that are changed on the way in', () => {
    const host = hostOf({ ...CELLS, D1: '=COMPOSITION.AT.EQUILIBRIUM("A + B = 2 C", 4, A1:A3*2)' });
    expect(host.values('S!D1:D3')).toEqual([[1], [1], [2]]);
  });

  it('are found behind range names, which the engine learns too late', () => {
    const host = hostOf(
      { A1: 1, A2: 1, A3: 0, B1: '=COMPOSITION.AT.EQUILIBRIUM("A + B = 2 C", 4, charge)' },
      { names: { charge: 'S!$A$1:$A$3' } },
    );
    expect(host.values('S!B1:B3')).toEqual([[0.5], [0.5], [1]]);
    expect(host.evaluate().formulas['S!B1']).toMatchObject({
      formula: '=COMPOSITION.AT.EQUILIBRIUM("A + B = 2 C", 4, charge)',
      comesFrom: ['S!A1:A3'],
    });
  });

  it('of one number where a table is due are an error, not broadcast', () => {
    const host = hostOf({ A1: 1, B1: '=EXTENT.SOLVE("A + B = 2 C", 4, A1)' });
    expect(host.values('S!B1')).toMatchObject({ error: 'amounts-table' });
  });
});

describe('functions', () => {
  it('of ours have names that the engine does not use, which it would override in silence', () => {
    expect(() => registerEvenkeel(hyperformula)).not.toThrow();
    const sum = { ...catalogue[0]!, name: 'SUM' };
    expect(() => registerEvenkeel(hyperformula, [sum])).toThrow('the function name SUM is taken');
  });

  it('that change by themselves are made repeatable or refused', () => {
    const host = hostOf({ A1: '=NOW()', A2: '=TODAY()', A3: '=RAND()', A4: '=RANDBETWEEN(1, 6)' });
    const evaluation = host.evaluate();
    expect(host.values('S!A2')).toBe(46082);
    expect(host.values('S!A1')).toBe(46082.25);
    expect(host.values('S!A3')).toMatchObject({ error: 'random-value' });
    expect(host.values('S!A4')).toMatchObject({ error: 'random-value' });
    expect(evaluation.instant).toBe(INSTANT);
    expect(hostOf({ A1: 1 }).evaluate().instant).toBeNull();
  });
});

describe('evidence', () => {
  const SOLVE = 'EXTENT.SOLVE("A + B = 2 C", 4, {1;1;0})';

  it('is kept for every call in a cell', () => {
    const { formulas } = hostOf({ A1: `=${SOLVE}+EXTENT.SOLVE("A = B", 1, {1;0})` }).evaluate();
    expect(formulas['S!A1']!.answers.map(({ outcome }) => outcome!.status)).toEqual(['settled', 'settled']);
  });

  it('is renewed, not piled up, when an input changes', () => {
    const host = hostOf(
      { A1: 1, A2: 1, A3: 0, B1: '=EXTENT.SOLVE("A + B = 2 C", 4, A1:A3)' },
      { inputs: [{ name: 'a', cell: 'S!A1', unit: null, min: null, max: null, uncertainty: null }] },
    );
    host.set({ a: 2 });
    const { answers } = host.evaluate().formulas['S!B1']!;
    expect(answers).toHaveLength(1);
    expect(answers[0]!.outcome!.problem).toMatchObject({ feed: [2, 1, 0] });
  });

  it('goes away when the call fails', () => {
    const host = hostOf(
      { A1: 1, A2: 1, A3: 0, B1: '=EXTENT.SOLVE("A + B = 2 C", 4, A1:A3)' },
      { inputs: [{ name: 'a', cell: 'S!A1', unit: null, min: null, max: null, uncertainty: null }] },
    );
    host.set({ a: -2 });
    expect(host.evaluate().formulas['S!B1']!.answers).toEqual([]);
  });
});

describe('evidence of a call inside an argument', () => {
  it('is renewed also where another argument has become an error', () => {
    const inner = 'COMPOSITION.AT.EQUILIBRIUM("A + B = 2 C", K1, A1:A3)';
    const host = hostOf(
      {
        A1: 1,
        A2: 1,
        A3: 0,
        J1: 1,
        K1: 4,
        L1: `=REACTION.QUOTIENT(IF(J1=1, "A + B = 2 C", NA()), ${inner})`,
      },
      { inputs: ['J1', 'K1'].map((cell) => ({ ...INPUT, name: cell, cell: `S!${cell}` })) },
    );
    host.set({ J1: 2, K1: 9 });
    const outcomes = host.evaluate().formulas['S!L1']!.answers.flatMap(({ outcome }) => outcome ?? []);
    expect(outcomes.map(({ problem }) => (problem as { lnK: number }).lnK)).toEqual([Math.log(9)]);
  });
});

describe('wildcards', () => {
  it('in criteria mean themselves', () => {
    const host = hostOf({ A1: 'a*', A2: 'ab', B1: '=COUNTIF(A1:A2, "a*")' });
    expect(host.values('S!B1')).toBe(1);
  });
});
