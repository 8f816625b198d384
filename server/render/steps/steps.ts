/** The steps of a calculation: its formulas in reading order, each knowing what it comes from. */
import type { Evaluation } from '../../evaluation.ts';
import { cellCount, cellsShared, isOneCell, type Reference } from '../../workbook/address.ts';
import { meeting, type Meeting } from './overlaps.ts';
import { inReadingOrder, referencesOf, type Numbered } from './readingOrder.ts';
import type { PlacedFormula } from './placedFormula.ts';
import { formulaRuns } from './runs.ts';

export interface Step {
  /** `2.1` */
  readonly number: string;
  readonly formulas: readonly [PlacedFormula, ...PlacedFormula[]];
  readonly fills: Reference;
  /** What the first of its formulas reads. */
  readonly comesFrom: readonly Source[];
}

/** A reference, the steps that fill some of it, and whether typed cells are among it. */
export interface Source {
  readonly reference: Reference;
  readonly steps: readonly string[];
  readonly hasTyped: boolean;
}

export interface Calculation {
  readonly steps: readonly Step[];
  readonly stepsIn: Meeting<Step>;
  /** The formulas that a reference rests on, its own included, in reading order. */
  readonly formulasBehind: (reference: Reference) => PlacedFormula[];
}

export function calculationOf(evaluation: Evaluation): Calculation {
  const numbered = inReadingOrder(formulaRuns(evaluation));
  const numberedIn = meeting(numbered.map((entry) => ({ ...entry, fills: entry.run.fills })));
  const steps = numbered.map((entry) => stepOf(entry, numberedIn));
  const formulas = steps.flatMap((step) => step.formulas);
  const formulasIn = meeting(formulas);
  return {
    steps,
    stepsIn: meeting(steps),
    formulasBehind(reference) {
      const found = new Set<PlacedFormula>();
      const waiting = [reference];
      for (let next = waiting.pop(); next !== undefined; next = waiting.pop()) {
        for (const placed of formulasIn(next)) {
          if (!found.has(placed)) waiting.push(...referencesOf(placed.formula.comesFrom));
          found.add(placed);
        }
      }
      return formulas.filter((formula) => found.has(formula));
    },
  };
}

/** `step-2-1`, where links to a step lead. */
export function stepId(number: string): string {
  return `step-${number.replace('.', '-')}`;
}

export function isRun(step: Step): boolean {
  return step.formulas.length > 1;
}

/** Whether each answer of the step is one cell. */
export function hasSingleAnswers(step: Step): boolean {
  return isOneCell(step.formulas[0].fills);
}

function stepOf({ number, run }: Numbered, numberedIn: Meeting<Numbered & { fills: Reference }>): Step {
  const comesFrom = referencesOf([...new Set(run.formulas[0].formula.comesFrom)]).map((reference) => {
    const sources = numberedIn(reference);
    const filled = sources.reduce((sum, { fills }) => sum + cellsShared(fills, reference), 0);
    return {
      reference,
      steps: sources.map((source) => source.number),
      hasTyped: filled < cellCount(reference),
    };
  });
  return { number, formulas: run.formulas, fills: run.fills, comesFrom };
}
