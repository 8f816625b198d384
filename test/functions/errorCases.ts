/**
 * For every error that an input can cause, a formula that raises it.
 */
import type { CellTable } from '../../functions/cells/entry.ts';

/** Code, formula, what the message must name, and the cells that the formula reads. */
export type ErrorCase = readonly [
  code: string,
  formula: string,
  names: string,
  cells?: Readonly<Record<string, CellTable>>,
];

const rows = (...A1: CellTable[number][]) => ({ A1 });
const solve = (equation: string, conditions = '') =>
  `=EXTENT.SOLVE("${equation}", 2, {1;1}${conditions === '' ? '' : `, CONDITIONS.TABLE(${conditions})`})`;
const check = (equation: string) => `=REACTION.CHECK("${equation}")`;

const VALUES: readonly ErrorCase[] = [
  ['argument-count', '=EXTENT.SOLVE("A = B")', 'equation, K, amounts'],
  ['argument-kind', '=K.VANTHOFF("high", 300, 10, 350)', 'the text "high"'],
  [
    'table-lies-otherwise',
    '=COMPOSITION.AT.EXTENT("A = B", A1:C2, 0.1)',
    '1 x 3',
    rows(['species', 'A', 'B'], ['amount', 1, 2]),
  ],
  ['table-strip', '=AMOUNTS.TABLE(A1:B2, {1,2})', 'species', rows(['A', 'B'], ['C', 'D'])],
  ['table-length', '=AMOUNTS.TABLE({"A","B"}, {1,2,3})', '3'],
  ['table-units', '=AMOUNTS.TABLE({"A","B"}, {1,2}, , 0.1)', 'units'],
];

const CONDITIONS: readonly ErrorCase[] = [
  ['condition-table', '=EXTENT.SOLVE("A = B", 2, {1;1}, 5)', 'the number 5'],
  ['condition-unknown', solve('A = B', '"temprature", 300, "K"'), 'row 1'],
  ['condition-twice', solve('A = B', '"temperature", 300, "K", "temperature", 310, "K"'), 'row 2'],
  ['condition-value', solve('A = B', '"temperature", "hot", "K"'), 'row 1 (temperature)'],
  ['condition-unit', solve('A = B', '"temperature", 300, "bar"'), 'row 1 (temperature)'],
  [
    'condition-uncertainty',
    '=EXTENT.SOLVE("A = B", 2, {1;1}, A1:D1)',
    'row 1 (temperature)',
    rows(['temperature', 300, 'K', -1]),
  ],
  ['condition-uncertainty-alone', solve('A = B', '"temperature uncertainty", 2, "K"'), 'row 1'],
  [
    'condition-missing',
    '=REACTION.AFFINITY("A = B", 2, {1;1}, CONDITIONS.TABLE("medium", "as given", ""))',
    'temperature',
  ],
  [
    'condition-range',
    solve('A(g) = 2 B(g)', '"pressure", -2, "bar gauge", "barometer", 1, "bar"'),
    'pressure',
  ],
  ['barometer-range', solve('A(g) = 2 B(g)', '"pressure", 2, "bar gauge", "barometer", 1013, "bar"'), '1013'],
  ['condition-inert', solve('A = B', '"inert", "N2", ""'), 'N2'],
  ['temperature-range', '=K.FROM.GIBBS(1, -5)', 'temperature'],
];

const AMOUNTS: readonly ErrorCase[] = [
  ['amounts-table', '=EXTENT.SOLVE("A = B", 2, 5)', 'the number 5'],
  ['amounts-species', '=EXTENT.SOLVE("A = B", 2, A1:C2)', 'row 2', rows(['A', 1, 'mol'], [null, 1, 'mol'])],
  ['amounts-blank', '=EXTENT.SOLVE("A = B", 2, A1:B2)', 'row 2 (B)', rows(['A', 1], ['B', null])],
  ['amounts-number', '=EXTENT.SOLVE("A = B", 2, A1:B2)', 'row 2 (B)', rows(['A', 1], ['B', 'much'])],
  ['amounts-unit', '=EXTENT.SOLVE("A = B", 2, A1:C2)', 'row 2 (B)', rows(['A', 1, 'mol'], ['B', 1, 5])],
  [
    'amounts-uncertainty',
    '=EXTENT.SOLVE("A = B", 2, A1:D2)',
    'row 1 (A)',
    rows(['A', 1, 'mol', -1], ['B', 1, 'mol', 0]),
  ],
  [
    'heading-uncertainty',
    '=EXTENT.SOLVE("A = B", 2, A1:D3)',
    'guess',
    rows(['species', 'amount', 'unit', 'guess'], ['A', 1, 'mol', 0], ['B', 1, 'mol', 0]),
  ],
  ['amounts-missing', '=EXTENT.SOLVE("A = B", 2, A1:B2)', 'C', rows(['A', 1], ['C', 1])],
  ['amounts-twice', '=EXTENT.SOLVE("A = B", 2, A1:B3)', 'row 3 (A)', rows(['A', 1], ['B', 1], ['A', 1])],
  ['amounts-count', '=EXTENT.SOLVE("A = B", 2, {1;1;1})', 'A, B'],
  ['amounts-negative', '=EXTENT.SOLVE("A = B", 2, A1:B2)', 'row 2 (B)', rows(['A', 1], ['B', -0.2])],
  ['amounts-unit-kind', '=EXTENT.SOLVE("A = B", 2, A1:C2)', 'kJ', rows(['A', 1, 'kJ'], ['B', 1, 'kJ'])],
  [
    'amounts-mixed',
    '=EXTENT.SOLVE("A = B", 2, A1:C2)',
    'row 2 (B)',
    rows(['A', 1, 'mol'], ['B', 1, 'mol/L']),
  ],
  [
    'amounts-as-given',
    '=EXTENT.SOLVE("2 A = B", 2, A1:C2)',
    'row 2 (B)',
    rows(['A', 1, 'mol'], ['B', 1, 'kmol']),
  ],
  [
    'amounts-fraction',
    '=EXTENT.SOLVE("A(l) = B(l)", 2, A1:C2, CONDITIONS.TABLE("medium", "ideal liquid", ""))',
    'row 1 (A(l))',
    rows(['A(l)', 60, '%'], ['B(l)', 40, '%']),
  ],
  [
    'amounts-dissolved',
    '=EXTENT.SOLVE("HA(aq) = H^+(aq) + A^-(aq)", 0.00001, A1:C3)',
    'row 1 (HA(aq))',
    rows(['HA(aq)', 100, 'mmol/L'], ['H^+(aq)', 0, 'mmol/L'], ['A^-(aq)', 0, 'mmol/L']),
  ],
  [
    'heading-unit',
    '=EXTENT.SOLVE("A = B", 2, A1:B3)',
    'amount / kmol',
    rows(['species', 'amount / kmol'], ['A', 1], ['B', 0]),
  ],
  [
    'amounts-basis',
    '=EXTENT.SOLVE("A(g) = 2 B(g)", 2, A1:C2, E1:G1)',
    'mol/L',
    { ...rows(['A', 1, 'mol/L'], ['B', 1, 'mol/L']), E1: [['pressure', 1, 'bar']] },
  ],
  ['amounts-unlabelled', '=COMPOSITION.FRACTIONS({1;2})', 'species'],
];

const MEDIUM: readonly ErrorCase[] = [
  ['medium-two-rows', solve('A(g) = 2 B(g)', '"pressure", 1, "bar", "volume", 1, "L"'), 'volume'],
  ['medium-as-given', solve('A(g) = 2 B(g)', '"pressure", 1, "bar", "medium", "as given", ""'), 'pressure'],
  ['medium-phase', solve('A(g) = B(l)', '"medium", "ideal liquid", ""'), 'A(g)'],
  ['medium-tags-forgotten', solve('A = B', '"pressure", 1, "bar"'), '(g)'],
  ['medium-missing', solve('A(g) = 2 B(g)'), '+1'],
  ['medium-liquids', solve('A(l) = B(l)'), 'ideal liquid'],
  ['medium-untagged', solve('A(g) = B', '"pressure", 1, "bar"'), 'B'],
  ['medium-unknown', '=K.RESTATE(2, "A = 2 B", "activity", "mole fraction")', 'A = 2 B'],
  ['constant-value', '=EXTENT.SOLVE("A = B", -1, {1;1})', 'K = -1'],
  [
    'constant-basis',
    solve('A(aq) = 2 B(aq)', '"medium", "solution", "", "K in terms of", "pressure", "bar"'),
    'pressure bar',
  ],
  ['constant-too-large', '=K.FROM.GIBBS(-100000, 10)', 'ln K'],
  [
    'restate-rows',
    '=K.RESTATE(2, "A(g) = 2 B(g)", "activity", "pressure atm", CONDITIONS.TABLE("K written as", "ln K", ""))',
    'K written as',
  ],
  ['restate-terms', '=K.RESTATE(2, "A(g) = 2 B(g)", "activity", "fugacity")', 'fugacity'],
];

const ANSWERS: readonly ErrorCase[] = [
  ['equation-not-checked', check('acid = ester'), 'acid, ester'],
  ['quotient-undefined', '=REACTION.QUOTIENT("A = B", {0;1})', 'A'],
  ['quotient-too-large', '=REACTION.QUOTIENT("3 A = 3 B", {1E150;1E-150})', 'ln Q is -2072'],
  ['affinity-infinite', '=REACTION.REDUCED.AFFINITY("A = B", 2, {1;0})', 'B'],
  ['reaction-blocked', '=REACTION.DIRECTION("A + B = C + D", 2, {0;1;0;1})', 'A + B = C + D'],
  [
    'uncertainty-missing',
    '=REACTION.FORWARD.PROBABILITY("A = B", 2, {1;1}, CONDITIONS.TABLE("medium", "as given", ""))',
    'K uncertainty',
  ],
  ['problem-unfit', '=REACTION.QUOTIENT("A = B", {1E-300;1})', 'amount of A'],
  ['not-solved', '=EXTENT.SOLVE("A = B", 2, {1E-300;1})', 'refused'],
  ['extent-infeasible', '=COMPOSITION.AT.EXTENT("A = B", {1;1}, 2)', '2'],
  ['evidence-item', '=EXTENT.EVIDENCE("A = B", 2, {1;1}, , "colour")', 'colour'],
  ['phase-unknown-line', '=COMPOSITION.FRACTIONS(A1:B2, , "g")', 'row 1 (A)', rows(['A', 1], ['B(g)', 1])],
  ['phase-word', '=COMPOSITION.FRACTIONS(A1:B2, , "gas")', 'gas', rows(['A', 1], ['B', 1])],
  ['left-out-missing', '=COMPOSITION.FRACTIONS(A1:B2, "H2O")', 'H2O', rows(['A', 1], ['B', 1])],
  ['fractions-nothing', '=COMPOSITION.FRACTIONS(A1:B2)', 'amounts', rows(['A', 0], ['B', 0])],
  ['conversion-species', '=CONVERSION.AT.EQUILIBRIUM("A = B", 2, {1;1}, , "B")', 'B'],
  ['conversion-nothing-fed', '=CONVERSION.AT.EQUILIBRIUM("A = B", 2, {0;1})', 'A'],
];

const NOTATION: readonly ErrorCase[] = [
  ['species-unreadable', '=COMPOSITION.FRACTIONS(A1:B2)', 'row 2', rows(['A', 1], ['?', 1])],
  ['formula-unreadable', check('H2(O = B'), 'H2(O'],
  ['formula-two-readings', check('Fe3+ = Fe'), 'Fe^3+'],
  ['element-unknown', check('Xy2 = B'), 'Xy'],
  ['name-or-formula', check('NaCL = B'), 'NaCl'],
  ['isotope', check('D2O = H2O'), 'D2O'],
  ['charge-unreadable', check('Ca^x = Ca'), '^x'],
  ['phase-unknown', check('H2O(liq) = H2O(g)'), '(liq)'],
  ['composition-missing', '=REACTION.BALANCE("acid = ester")', 'acid'],
  [
    'weight-missing',
    '=EXTENT.SOLVE("Tc(s) = Tc(g)", 2, A1:C2, E1:G1)',
    'row 1 (Tc(s))',
    { ...rows(['Tc(s)', 1, 'kg'], ['Tc(g)', 1, 'kg']), E1: [['pressure', 1, 'bar']] },
  ],
  [
    'charge-missing',
    '=EXTENT.SOLVE("H2O + CO2 = H+ + HCO3-", 2, A1:C4)',
    'row 1 (H2O)',
    rows(['H2O', 1, 'meq/L'], ['CO2', 1, 'meq/L'], ['H+', 1, 'meq/L'], ['HCO3-', 1, 'meq/L']),
  ],
  ['equation-too-long', `=REACTION.CHECK(REPT("A + ", 300)&"A = B")`, '1000'],
  ['equation-sign', check('A = B = C'), '2'],
  ['equation-side-empty', check('A ='), 'right'],
  ['equation-term', check('A + = B'), 'left'],
  ['equation-coefficient', check('0 A = B'), '0'],
  ['equation-doubled', check('A + A = B'), 'both on the left'],
  ['equation-unbalanced', check('N2 + H2 = NH3'), 'N'],
  ['balance-none', '=REACTION.BALANCE("H2 = O2")', 'H2 = O2'],
  ['balance-not-unique', '=REACTION.BALANCE("CO + CO2 + H2 = CH3OH + H2O")', '2'],
  [
    'species-two-readings',
    '=EXTENT.SOLVE("H2O(l) = H2O(g)", 2, A1:C2, E1:G1)',
    'row 1 (H2O)',
    { ...rows(['H2O', 1, 'mol'], ['H2O(g)', 1, 'mol']), E1: [['pressure', 1, 'bar']] },
  ],
];

const UNITS: readonly ErrorCase[] = [
  ['unit-unknown', '=UNITS.CONVERT(1, "barr", "bar")', 'is bar meant?'],
  ['unit-reference', '=UNITS.CONVERT(1, "Nm3", "mol")', 'Nm3'],
  ['unit-incompatible', '=UNITS.CONVERT(1, "kg", "bar")', 'mass'],
  ['unit-not-expressible', '=UNITS.CONVERT(1, "mol as N", "mol")', 'mol as N'],
  [
    'unit-not-molar',
    '=COMPOSITION.FRACTIONS(A1:C2)',
    'row 1 (A)',
    rows(['A', 1, 'vol %'], ['B', 1, 'vol %']),
  ],
];

export const ERROR_CASES = [VALUES, CONDITIONS, AMOUNTS, MEDIUM, ANSWERS, NOTATION, UNITS].flat();
