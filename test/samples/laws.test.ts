/** What must hold in the samples whatever their inputs: elements are conserved, responses have one sign. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { RunningSample } from './sample.ts';

const SEED = 20_260_101;
const CASES = 60;
/** Sums of a few doubles, each rounded once: a few parts in 1e16 of the largest, with room for the solver's. */
const ROUNDED = 1e-13;

/** A millionth of the range apart: amounts that a person may type. */
const STEPS = 1_000_000;
const between = (min: number, max: number) =>
  fc.integer({ min: 0, max: STEPS }).map((step) => min + ((max - min) * step) / STEPS);

describe('the kettle', () => {
  const kettle = new RunningSample('kettle.yaml');
  const charge = fc.record({
    constant: between(1.5, 10),
    acid: between(1, 50),
    ethanol: between(1, 50),
    water: between(0, 20),
    water_drawn: fc.constant(0),
  });

  it('conserves carbon, hydrogen and oxygen', () => {
    fc.assert(
      fc.property(charge, (given) => {
        kettle.number('extent', given);
        const fed = kettle.column('Kettle!B6:B9');
        const found = kettle.column('Kettle!D6:D9');
        // Atoms in acetic acid, ethanol, ethyl acetate and water.
        for (const atoms of [
          [2, 2, 4, 0],
          [4, 6, 8, 2],
          [2, 1, 2, 1],
        ]) {
          const total = (amounts: number[]) => amounts.reduce((sum, n, i) => sum + n * atoms[i]!, 0);
          expect(Math.abs(total(found) / total(fed) - 1)).toBeLessThan(ROUNDED);
        }
      }),
      { seed: SEED, numRuns: CASES },
    );
  });

  it('agrees with the quadratic formula', () => {
    fc.assert(
      fc.property(charge, (given) => {
        const extent = kettle.number('extent', given);
        // The formula loses up to three digits to cancellation where K is large beside the charge.
        expect(Math.abs(kettle.number('quadratic') / extent - 1)).toBeLessThan(1e-12);
      }),
      { seed: SEED, numRuns: CASES },
    );
  });

  it('makes more ester the more water is drawn off', () => {
    const given = { constant: 4, acid: 12, ethanol: 14, water: 1.5 };
    const made = [0, 1, 3, 5, 7, 9].map((water_drawn) =>
      kettle.number('extent_drawn', { ...given, water_drawn }),
    );
    expect(made).toEqual([...made].sort((a, b) => a - b));
    expect(new Set(made).size).toBe(made.length);
  });
});

describe('the converter', () => {
  const converter = new RunningSample('converter.yaml');

  it('converts more at a higher pressure and less at a higher temperature or with more nitrogen', () => {
    fc.assert(
      fc.property(between(400, 690), between(0, 9), between(0, 9000), (temperature, pressure, N2) => {
        const given = { temperature, pressure, N2 };
        const base = converter.number('conversion', given);
        expect(converter.number('conversion', { ...given, pressure: pressure + 1 })).toBeGreaterThan(base);
        expect(converter.number('conversion', { ...given, temperature: temperature + 10 })).toBeLessThan(
          base,
        );
        expect(converter.number('conversion', { ...given, N2: N2 + 500 })).toBeLessThan(base);
      }),
      { seed: SEED, numRuns: CASES },
    );
  });
});

describe('the closed vessel', () => {
  const vessel = new RunningSample('closedVessel.yaml');

  it('holds the dissociation pressure whatever the charge, until the charge is used up', () => {
    fc.assert(
      fc.property(between(1, 200), between(0.1, 500), (volume, small_charge) => {
        const pressure = vessel.number('pressure', { charge: 1000, volume, small_charge });
        const smallest = vessel.number('smallest_charge');
        const small = vessel.number('small_pressure');
        expect(Math.abs(pressure / 0.487151092586737 - 1)).toBeLessThan(ROUNDED);
        const expected = small_charge > smallest ? pressure : (pressure * small_charge) / smallest;
        expect(Math.abs(small / expected - 1)).toBeLessThan(ROUNDED);
      }),
      { seed: SEED, numRuns: CASES },
    );
  });
});

describe('the log of the reactor', () => {
  it('agrees in every row with the root of its quadratic', () => {
    const log = new RunningSample('reactorLog.yaml');
    const column = (letter: string) => log.column(`Log!${letter}18:${letter}217`);
    const [pressure, ethylbenzene, styrene, steam] = ['C', 'D', 'E', 'G'].map(column) as [
      number[],
      number[],
      number[],
      number[],
    ];
    const constants = column('J');
    column('K').forEach((conversion, row) => {
      // (s + x) x p = K (e - x)(n + x), n the whole feed: a x^2 + b x - c = 0, whose root has no cancellation.
      const [K, p] = [constants[row]!, pressure[row]! + 1.008];
      const [e, s] = [ethylbenzene[row]!, styrene[row]!];
      const n = e + s + steam[row]!;
      const [a, b, c] = [K + p, s * p + K * (n - e), K * e * n];
      const x = (2 * c) / (b + Math.sqrt(b * b + 4 * a * c));
      expect(Math.abs(conversion / (x / e) - 1)).toBeLessThan(ROUNDED);
    });
  });
});
