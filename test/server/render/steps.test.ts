import { expect, test } from 'vitest';
import type { Evaluation, FormulaCell } from '../../../server/evaluation.ts';
import { calculationOf } from '../../../server/render/steps/steps.ts';
import { referenceName } from '../../../server/workbook/address.ts';
import { kettle } from './fixtures/kettle.ts';

/** Formulas on one sheet, each with the cells that it reads. */
function evaluationOf(
  formulas: Record<string, [formula: string, comesFrom: string[], lastCell?: string]>,
): Evaluation {
  const placed: Record<string, FormulaCell> = {};
  for (const [cell, [formula, comesFrom, lastCell]] of Object.entries(formulas)) {
    placed[`S!${cell}`] = {
      formula,
      lastCell: lastCell === undefined ? null : `S!${lastCell}`,
      comesFrom: comesFrom.map((one) => `S!${one}`),
      answers: [],
    };
  }
  return { ...kettle(), sheets: { S: [] }, formulas: placed };
}

function summary(evaluation: Evaluation) {
  return calculationOf(evaluation).steps.map(({ number, fills }) => `${number} ${referenceName(fills)}`);
}

test('steps stand in order of dependence, then of rows and columns', () => {
  const evaluation = evaluationOf({
    A1: ['=B9*2', ['B9']],
    C2: ['=A1+B1', ['A1', 'B1']],
    B9: ['=D1+1', ['D1']],
    B3: ['=SUM(A1:C2)', ['A1:C2']],
    D2: ['=D1', ['D1']],
  });
  expect(summary(evaluation)).toEqual(['1.1 S!D2', '1.2 S!B9', '2.1 S!A1', '3.1 S!C2', '4.1 S!B3']);
});

test('formulas alike from where they stand are one step, down or across', () => {
  const down = evaluationOf({ B1: ['=A1*$D$1', ['A1']], B2: ['=A2*$D$1', ['A2']], B3: ['=A3*$D$2', ['A3']] });
  expect(summary(down)).toEqual(['1.1 S!B1:B2', '1.2 S!B3']);
  const across = evaluationOf({ A2: ['=A1', ['A1']], B2: ['=B1', ['B1']], C2: ['=C1', ['C1']] });
  expect(summary(across)).toEqual(['1.1 S!A2:C2']);
});

test('words that only look like cells are not moved', () => {
  const evaluation = evaluationOf({
    B1: ['=LOG10(A1)&"A1"', ['A1']],
    B2: ['=LOG10(A2)&"A1"', ['A2']],
    B3: ['=LOG10(A3)&"A3"', ['A3']],
  });
  expect(summary(evaluation)).toEqual(['1.1 S!B1:B2', '1.2 S!B3']);
});

test('array answers one below the other are one step', () => {
  const evaluation = evaluationOf({
    B1: ['=F(A1)', ['A1'], 'D1'],
    B2: ['=F(A2)', ['A2'], 'D2'],
    F1: ['=D2', ['D2']],
  });
  expect(summary(evaluation)).toEqual(['1.1 S!B1:D2', '2.1 S!F1']);
});

test('columns that read each other from row to row still come to an end', () => {
  const evaluation = evaluationOf({
    B2: ['=C1+1', ['C1']],
    C2: ['=B2*2', ['B2']],
    B3: ['=C2+1', ['C2']],
    C3: ['=B3*2', ['B3']],
  });
  expect(summary(evaluation)).toEqual(['1.1 S!B2:B3', '2.1 S!C2:C3']);
});

test('a step knows the steps it comes from and whether typed cells are among its sources', () => {
  const { steps } = calculationOf(
    evaluationOf({ B1: ['=A1', ['A1']], C1: ['=SUM(A1:B1)+B1', ['A1:B1', 'B1']] }),
  );
  expect(steps[1]!.comesFrom.map(({ steps: from, hasTyped }) => ({ from, hasTyped }))).toEqual([
    { from: ['1.1'], hasTyped: true },
    { from: ['1.1'], hasTyped: false },
  ]);
});

test('the formulas behind a cell are all that it rests on, and no others', () => {
  const calculation = calculationOf(
    evaluationOf({ B1: ['=A1', ['A1']], B2: ['=A2', ['A2']], C5: ['=B1', ['B1']], D1: ['=C5', ['C5']] }),
  );
  const { fills } = calculation.steps.find(({ formulas }) => formulas[0].address === 'S!C5')!;
  expect(calculation.formulasBehind(fills).map(({ address }) => address)).toEqual(['S!B1', 'S!C5']);
});

test('formulas that rest on one another by many ways are each met once', () => {
  // with every way walked, 60 rows of two sources each would take 2^60 visits
  const rows = Array.from({ length: 60 }, (_, index) => index + 1);
  const formulas = Object.fromEntries(
    rows.map((row) => [
      `B${row + 1}`,
      [`=B${row}*${row}+B${row}`, [`B${row}`, `A${row}:B${row}`]] as [string, string[]],
    ]),
  );
  const calculation = calculationOf(evaluationOf(formulas));
  expect(calculation.formulasBehind(calculation.steps.at(-1)!.fills)).toHaveLength(60);
});
