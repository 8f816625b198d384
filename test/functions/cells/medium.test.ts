/** Which medium a reaction runs in, met through formula cells. */
import { describe, expect, it } from 'vitest';
import type { CellTable } from '../../../functions/cells/entry.ts';
import { messageFrom, numberOf, rowsOf } from './asking.ts';
import { doubling } from './doubling.ts';

describe('the medium is never guessed', () => {
  it('for a pressure or a volume where no gas is tagged', () => {
    const pressure = messageFrom(
      'medium-tags-forgotten',
      ...doubling('', 2, 'mol', [['pressure', 1, 'bar']]),
    );
    expect(pressure).toContain('give a pressure');
    expect(pressure).toContain('Tag the gases with (g)');
    const volume = messageFrom('medium-tags-forgotten', ...doubling('', 2, 'mol', [['volume', 1, 'L']]));
    expect(volume).toContain('give a volume');
  });

  it('for a gas whose amount changes, unless a pressure, a volume or as given is stated', () => {
    const message = messageFrom('medium-missing', '=EXTENT.SOLVE("A(g) = 2 B(g)", 2, {1;0})');
    expect(message).toContain('changes by +1');
    expect(message).toContain('pressure row');
    // As given x is at (2x)^2 = 2 (1 - x), a half, exactly.
    expect(numberOf(...doubling('(g)', 2, 'mol', [['medium', 'as given', null]]))).toBeCloseTo(0.5, 15);
  });

  it('for a gas whose amount stays, which needs neither', () => {
    expect(numberOf('=EXTENT.SOLVE("H2(g) + I2(g) = 2 HI(g)", 4, {1;1;0})')).toBeCloseTo(0.5, 15);
  });

  it('for a species without a tag among gases', () => {
    const formula = '=EXTENT.SOLVE("A(g) = B + C(g)", 2, {1;0;0}, CONDITIONS.TABLE("pressure", 1, "bar"))';
    expect(messageFrom('medium-untagged', formula)).toContain('B has no phase tag');
  });

  it('for several liquids, which may be one solution or lie apart', () => {
    const formula = '=EXTENT.SOLVE("A(l) + B(l) = C(l)", 2, {1;1;0})';
    expect(messageFrom('medium-liquids', formula)).toContain('ideal liquid');
  });

  it('from rows and tags that contradict one another', () => {
    const both: CellTable = [
      ['pressure', 1, 'bar'],
      ['volume', 1, 'L'],
    ];
    const message = messageFrom('medium-two-rows', ...doubling('(g)', 2, 'mol', both));
    expect(message).toContain('both a pressure row and a volume row');
    const gasInLiquid = doubling('(g)', 2, 'mol', [['medium', 'ideal liquid', null]]);
    expect(messageFrom('medium-phase', ...gasInLiquid)).toContain('A(g) is neither mixed in the medium');
    const asGiven: CellTable = [
      ['medium', 'as given', null],
      ['pressure', 1, 'bar'],
    ];
    expect(messageFrom('medium-as-given', ...doubling('(g)', 2, 'mol', asGiven))).toContain('pressure');
  });

  it('for amounts whose unit does not fit it', () => {
    const fraction = doubling('(g)', 2, 'mol %', [
      ['volume', 1, 'L'],
      ['temperature', 300, 'K'],
    ]);
    expect(messageFrom('amounts-basis', ...fraction)).toContain('mol, mol/L or bar');
    const solution = doubling('(aq)', 2, 'mol', [['medium', 'solution', null]]);
    expect(messageFrom('condition-missing', ...solution)).toContain('volume');
  });

  it('is told by the evidence', () => {
    const medium = (tag: string, unit: string, ...rows: CellTable) =>
      rowsOf(...doubling(tag, 2, unit, rows, 'EXTENT.EVIDENCE', ', "medium"'))[0]![0];
    expect(medium('(g)', 'mol', ['pressure', 1, 'bar'])).toBe('gas');
    expect(medium('(aq)', 'mol/L', ['medium', 'solution', null])).toBe('solution');
    expect(medium('', 'mol', ['medium', 'ideal liquid', null])).toBe('ideal liquid');
    expect(medium('', 'mol', ['K written as', 'K', null])).toBe('as given');
  });
});

describe('pure phases', () => {
  const limestone = (CaO: number, pressure: number) =>
    [
      '=REACTION.DIRECTION("CaCO3(s) = CaO(s) + CO2(g)", 0.5, A1:C3, E1:G1)',
      {
        A1: [
          ['CaCO3(s)', 1, 'mol'],
          ['CaO(s)', CaO, 'mol'],
          ['CO2(g)', 1, 'mol'],
        ] as CellTable,
        E1: [['pressure', pressure, 'bar']] as CellTable,
      },
    ] as const;

  it('have unit activity, whatever their amount', () => {
    expect(rowsOf(...limestone(1e-9, 0.4))).toEqual([['forward']]);
    expect(rowsOf(...limestone(1e-9, 0.6))).toEqual([['reverse']]);
  });

  it('that are absent where they would be used up leave the reaction exhausted', () => {
    expect(rowsOf(...limestone(0, 0.6))).toEqual([['exhausted']]);
  });
});
