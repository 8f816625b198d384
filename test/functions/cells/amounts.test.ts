/** How strictly an amounts table is read, met through formula cells. */
import { describe, expect, it } from 'vitest';
import type { CellTable } from '../../../functions/cells/entry.ts';
import { messageFrom, numberOf, rowsOf } from './asking.ts';

const EQUATION = 'N2(g) + 3 H2(g) = 2 NH3(g)';
const PRESSURE: CellTable = [['pressure', 10, 'bar']];
const K = 0.01;
const FEED: CellTable = [
  ['N2(g)', 1, 'mol'],
  ['H2(g)', 3, 'mol'],
  ['NH3(g)', 0.5, 'mol'],
];

/** The formula of a function of the synthesis for the amounts in A1 of this size and E1:G1. */
const asked = (name: string, range: string, more = '') =>
  `=${name}("${EQUATION}", ${K}, ${range}, G1:I1${more})`;
const cells = (A1: CellTable) => ({ A1, G1: PRESSURE });
const withRow = (index: number, row: CellTable[number]) => FEED.map((line, i) => (i === index ? row : line));

describe('a row', () => {
  const refused = (code: string, A1: CellTable, range = 'A1:C3') =>
    messageFrom(code, asked('EXTENT.SOLVE', range), cells(A1));

  it('that is blank in its amount is an error, for a blank means to be found', () => {
    const message = refused('amounts-blank', withRow(2, ['NH3(g)', null, 'mol']));
    expect(message).toContain('amounts row 3 (NH3(g))');
    expect(message).toContain('0 where the species is absent');
  });

  it('that is missing is an error, which shows a misspelt one beside it', () => {
    const message = refused('amounts-missing', withRow(1, ['He(g)', 3, 'mol']));
    expect(message).toContain('no line for H2(g)');
    expect(message).toContain('He(g)');
    expect(message).toContain('type 0');
  });

  it('given twice is an error, with and without its tag', () => {
    const message = refused('amounts-twice', [...FEED, ['NH3', 1, 'mol']], 'A1:C4');
    expect(message).toContain('row 4 (NH3)');
    expect(message).toContain('row 3 (NH3(g))');
  });

  it('below zero is an error that names the row, its unit and the remedy', () => {
    const message = refused('amounts-negative', withRow(0, ['N2(g)', -0.2, 'mol']));
    expect(message).toContain('row 1 (N2(g)) is -0.2 mol');
    expect(message).toContain('removal | allowed');
  });

  it('whose amount is a text that looks like a number is an error', () => {
    expect(refused('amounts-number', withRow(0, ['N2(g)', '1', 'mol']))).toContain('the text "1"');
  });

  it('with a unit that measures no amount, or none that is known, is an error', () => {
    expect(refused('amounts-unit-kind', withRow(1, ['H2(g)', 3, 'm3/h']))).toContain('row 2 (H2(g))');
    expect(refused('unit-unknown', withRow(1, ['H2(g)', 3, 'Mol']))).toContain('is mol meant?');
    expect(refused('unit-reference', withRow(1, ['H2(g)', 3, 'Nm3']))).toContain('Nm3(0 degC, 1.01325 bar)');
  });

  it('in a unit of another kind than the first is an error that names both', () => {
    const message = refused('amounts-mixed', withRow(2, ['NH3(g)', 0, 'mol/L']));
    expect(message).toMatch(/row 1 \(N2\(g\)\) is in mol, .*row 3 \(NH3\(g\)\) in mol\/L/);
  });

  it('whose label may be two species is an error that shows them', () => {
    const message = messageFrom(
      'species-two-readings',
      '=EXTENT.SOLVE("H2O(l) = H2O(g)", 0.5, A1:C2, G1:I1)',
      {
        A1: [
          ['H2O', 1, 'mol'],
          ['H2O(g)', 0, 'mol'],
        ],
        G1: PRESSURE,
      },
    );
    expect(message).toContain('H2O(l), H2O(g)');
  });

  it('without its tag is taken for the one species that it can be', () => {
    const untagged = FEED.map(([label, ...rest]) => [
      (label as string).replace('(g)', ''),
      ...rest,
    ]) as CellTable;
    const extent = (A1: CellTable) => numberOf(asked('EXTENT.SOLVE', 'A1:C3'), cells(A1));
    expect(extent(untagged)).toBe(extent(FEED));
  });
});

describe('rows that are no species of the equation', () => {
  const withArgon: CellTable = [...FEED, ['Ar(g)', 2, 'mol'], ['He(g)', 1, 'mol']];

  it('are listed by the evidence, so that a misspelling shows', () => {
    expect(rowsOf(asked('EXTENT.EVIDENCE', 'A1:C5', ', "inert species"'), cells(withArgon))).toEqual([
      ['Ar(g), He(g)'],
    ]);
  });

  it('may be held out of reaction by name, with or without the tag; a name that is not fed is an error', () => {
    const held = (name: string) =>
      [
        '=EXTENT.SOLVE("A(g) = 2 B(g)", 2, A1:C3, E1:G2)',
        {
          A1: [
            ['A(g)', 1, 'mol'],
            ['B(g)', 0, 'mol'],
            ['N2(g)', 1, 'mol'],
          ],
          E1: [
            ['pressure', 1, 'bar'],
            ['inert', name, null],
          ],
        },
      ] as [string, Record<string, CellTable>];
    expect(numberOf(...held('N2'))).toBe(numberOf(...held('N2(g)')));
    expect(messageFrom('condition-inert', ...held('Ar'))).toContain('Ar');
  });

  it('thin the gas at a pressure, and keep their amount', () => {
    const thinned = numberOf(asked('EXTENT.SOLVE', 'A1:C5'), cells(withArgon));
    expect(thinned).toBeLessThan(numberOf(asked('EXTENT.SOLVE', 'A1:C3'), cells(FEED)));
    const found = rowsOf(asked('COMPOSITION.AT.EQUILIBRIUM', 'A1:C5'), cells(withArgon));
    expect(found.slice(3)).toEqual([[2], [1]]);
  });
});

describe('a removal', () => {
  const conditions = '"medium", "as given", "", "removal", "allowed", ""';
  const solved = (water: number, name = 'EXTENT.SOLVE') =>
    `=${name}("acid + alcohol = ester + water", 4, {1;1;0;${water}}, CONDITIONS.TABLE(${conditions}))`;

  it('is a negative amount that the conditions allow', () => {
    // x (x - 0.5) = 4 (1 - x)^2, so 3 x^2 - 7.5 x + 4 = 0; three roundings of a number near 1.
    const byHand = (7.5 - Math.sqrt(7.5 * 7.5 - 48)) / 6;
    expect(Math.abs(numberOf(solved(-0.5)) - byHand)).toBeLessThan(1e-15);
  });

  it('of more than can be made is refused with the reason', () => {
    expect(messageFrom('not-solved', solved(-1.5))).toContain('no extent leaves both');
    expect(rowsOf(solved(-1.5, 'EXTENT.EVIDENCE'))[0]).toEqual(['status', 'refused']);
  });
});

describe('the answer', () => {
  it('lines up with the table, its heading and its blank rows', () => {
    const table: CellTable = [
      ['species', 'amount', 'unit'],
      FEED[0]!,
      [null, null, null],
      FEED[1]!,
      FEED[2]!,
    ];
    const found = rowsOf(asked('COMPOSITION.AT.EQUILIBRIUM', 'A1:C5'), cells(table));
    expect(found.map(([value]) => (typeof value === 'number' ? 'number' : value))).toEqual([
      'at equilibrium',
      'number',
      null,
      'number',
      'number',
    ]);
  });

  it('lies across where the table does', () => {
    const atExtent = (table: string, A1: CellTable = [[0]]) =>
      rowsOf(`=COMPOSITION.AT.EXTENT("A = B", ${table}, 0.25)`, { A1 });
    expect(
      atExtent('AMOUNTS.TABLE(A1:B1, A2:B2, "mol")', [
        ['A', 'B'],
        [1, 0],
      ]),
    ).toEqual([[0.75, 0.25]]);
    expect(atExtent('{1,0}')).toEqual([[0.75, 0.25]]);
    expect(atExtent('{1;0}')).toEqual([[0.75], [0.25]]);
  });

  it('is in the unit of each row, in kg, kmol and mol beside one another', () => {
    const mixed: CellTable = [
      ['N2(g)', 28.014, 'kg'], // 1 kmol by the atomic weight of nitrogen, 14.007
      ['H2(g)', 3, 'kmol'],
      ['NH3(g)', 0, 'mol'],
    ];
    const [[kg], [kmol], [mol]] = rowsOf(
      asked('COMPOSITION.AT.EQUILIBRIUM', 'A1:C3'),
      cells(mixed),
    ) as number[][] as [[number], [number], [number]];
    const extentKmol = (28.014 - kg) / 28.014;
    // Each is rounded a few times in amounts up to 28; mol and kmol differ by 1000.
    expect(Math.abs(kmol - (3 - 3 * extentKmol))).toBeLessThan(1e-13);
    expect(Math.abs(mol / 1000 - 2 * extentKmol)).toBeLessThan(1e-13);
  });

  it('is the same mixture in mol % as in mol', () => {
    const percent = FEED.map(([label, amount]) => [label!, (amount as number) * 20, 'mol %']) as CellTable;
    const inMol = rowsOf(asked('COMPOSITION.AT.EQUILIBRIUM', 'A1:C3'), cells(FEED)).flat() as number[];
    const inPercent = rowsOf(asked('COMPOSITION.AT.EQUILIBRIUM', 'A1:C3'), cells(percent)).flat() as number[];
    inPercent.forEach((value, i) => expect(Math.abs(value / inMol[i]! - 20)).toBeLessThan(1e-12));
  });

  it('has the conversion of a named reactant whatever its unit', () => {
    const mass = withRow(0, ['N2(g)', 28.014, 'g']);
    const converted = (A1: CellTable) =>
      numberOf(asked('CONVERSION.AT.EQUILIBRIUM', 'A1:C3', ', "N2"'), cells(A1));
    expect(Math.abs(converted(mass) - converted(FEED))).toBeLessThan(1e-14);
  });
});

describe('standard uncertainties', () => {
  const probability = (A1: CellTable, range: string) =>
    numberOf(`=REACTION.FORWARD.PROBABILITY("A = B", 2, ${range}, G1:H1)`, {
      A1,
      G1: [['medium', 'as given']],
    });

  it('of an expanded uncertainty are it divided by the k of its heading', () => {
    const table = (heading: string, u: number): CellTable => [
      ['species', 'amount', 'unit', heading],
      ['A', 1, 'mol', u],
      ['B', 1.8, 'mol', u],
    ];
    const expanded = probability(table('expanded uncertainty (k=2)', 0.2), 'A1:D3');
    expect(expanded).toBe(probability(table('standard uncertainty', 0.1), 'A1:D3'));
    expect(expanded).toBeGreaterThan(0.5);
  });

  it('under any other heading are an error that shows how to write it', () => {
    const table: CellTable = [
      ['species', 'amount', 'unit', 'error'],
      ['A', 1, 'mol', 0.1],
      ['B', 1, 'mol', 0.1],
    ];
    const message = messageFrom('heading-uncertainty', '=EXTENT.SOLVE("A = B", 2, A1:D3)', { A1: table });
    expect(message).toContain('expanded uncertainty (k=2)');
  });
});

describe('a bare per cent', () => {
  const ASKED = '=EXTENT.SOLVE("CO + H2O = CO2 + H2", 1, A1:C4)';
  const shift = (tag: string, unit: string): CellTable => [
    [`CO${tag}`, 40, unit],
    [`H2O${tag}`, 40, unit],
    [`CO2${tag}`, 0, unit],
    [`H2${tag}`, 20, unit],
  ];

  it('is taken as it is given where no tag says otherwise', () => {
    // x (20 + x) = (40 - x)^2, so x = 16
    expect(numberOf(ASKED, { A1: shift('', '%') })).toBeCloseTo(16, 12);
    expect(numberOf(ASKED, { A1: shift('', 'mol %') })).toBeCloseTo(16, 12);
  });

  it('is the amount fraction of a gas, and an error of a liquid', () => {
    const tagged = (tag: string) => ASKED.replace(/(CO2|CO|H2O|H2)(?= )|(H2)(?=")/g, `$&${tag}`);
    expect(numberOf(tagged('(g)'), { A1: shift('(g)', '%') })).toBeCloseTo(16, 12);
    const liquid = tagged('(l)').replace('A1:C4', 'A1:C4, CONDITIONS.TABLE("medium", "ideal liquid", "")');
    expect(messageFrom('amounts-fraction', liquid, { A1: shift('(l)', '%') })).toContain('row 1 (CO(l))');
  });
});
