/** Units of the trade against their published factors. */
import { testFigures } from './figures.ts';

const SP811 = 'NIST SP 811 (2008), appendix B (from memory)';
const SI = 'SI Brochure, 9th edition (from memory)';

/** Exact factors may be off by the rounding of two operations. */
const EXACT = 4e-16;

const factors: readonly (readonly [
  from: string,
  to: string,
  factor: number,
  last: number,
  source: string,
])[] = [
  ['atm', 'kPa', 101.325, 0, SP811],
  ['psi', 'kPa', 6.894757, 5e-7, SP811],
  ['torr', 'Pa', 133.3224, 5e-5, SP811],
  ['inHg', 'kPa', 3.386389, 5e-7, SP811],
  ['kgf/cm2', 'kPa', 98.0665, 0, SP811],
  ['cal', 'J', 4.184, 0, SP811],
  ['Btu', 'kJ', 1.055056, 5e-7, SP811],
  ['lb', 'kg', 0.45359237, 0, SP811],
  ['US gal', 'L', 3.785412, 5e-7, SP811],
  ['ft3', 'L', 28.31685, 5e-6, SP811],
  ['lbmol', 'mol', 453.59237, 0, SP811],
  ['t', 'kg', 1000, 0, SI],
  ['h', 's', 3600, 0, SI],
  ['kWh', 'MJ', 3.6, 0, SI],
  ['kmol/h', 'mol/s', 0.2777778, 5e-8, SI],
  [
    'Nm3(0 degC, 1.01325 bar)',
    'mol',
    44.61503,
    5e-6,
    'CODATA 2018: molar volume 22.413 969 54 L/mol (from memory)',
  ],
  [
    'Nm3(0 degC, 1 bar)',
    'mol',
    44.03161,
    5e-6,
    'CODATA 2018: molar volume 22.710 954 64 L/mol (from memory)',
  ],
];

testFigures([
  ...factors.map(([from, to, factor, last, source]) => ({
    is: `1 ${from} in ${to}`,
    source,
    formula: `=UNITS.CONVERT(1, "${from}", "${to}")`,
    printed: factor,
    within: last === 0 ? EXACT * factor : last,
  })),
  {
    is: '100 degC in degF',
    source: SI,
    formula: '=UNITS.CONVERT(100, "degC", "degF")',
    printed: 212,
    within: 1e-13,
  },
  {
    is: '-40 degF in degC',
    source: SI,
    formula: '=UNITS.CONVERT(-40, "degF", "degC")',
    printed: -40,
    within: 1e-13,
  },
  { is: '25 degC in K', source: SI, formula: '=UNITS.CONVERT(25, "degC", "K")', printed: 298.15, within: 0 },
]);
