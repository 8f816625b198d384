/**
 * What a formula cell costs beside the engine's own work for it, and beside bisection in plain cells.
 */
import * as hyperformula from 'hyperformula';
import { registerEvenkeel } from '../../functions/plugin.ts';
import { columnLetters } from '../../server/workbook/address.ts';
import { atLeast, atMost, type Row } from '../benchRow.ts';
import { shortestSeconds } from '../timing.ts';

const FORMULAS = 2000;
const BISECTION_STEPS = 40;
const BISECTED_ANSWERS = 50;
const FIRST_K = 1.5;
const EQUATION = '"CO(g) + H2O(g) = CO2(g) + H2(g)"';

type Cell = string | number | null;

/** Amounts for each formula one below the other, and K in E1. */
function amounts(): Cell[][] {
  const lines: Cell[][] = Array.from({ length: FORMULAS }, (_, i) => [
    ['CO(g)', 1 + i / FORMULAS, 'mol'],
    ['H2O(g)', 2, 'mol'],
    ['CO2(g)', 0.1, 'mol'],
    ['H2(g)', 0, 'mol'],
  ]).flat();
  lines[0]!.push(null, FIRST_K);
  return lines;
}

export function rows(): Row[] {
  registerEvenkeel(hyperformula);
  hyperformula.HyperFormula.registerFunctionPlugin(ReadingPlugin, { enGB: { 'READ.CELLS': 'READ.CELLS' } });
  const shortest = shortestSeconds({
    solving: renewal(formulas('EXTENT.SOLVE')),
    reading: renewal(formulas('READ.CELLS')),
    bisecting: renewal(bisections()),
  });
  const solving = shortest.solving / FORMULAS;
  const reading = shortest.reading / FORMULAS;
  const bisecting = shortest.bisecting / BISECTED_ANSWERS;
  return [
    atMost(1.5, 'a formula cell, against a function that only reads the same cells', solving / reading),
    atLeast(100, 'forty bisection steps in plain cells, against a formula cell', bisecting / solving),
  ];
}

/** Takes the arguments of EXTENT.SOLVE and reads every cell of them, in the way that the engine documents. */
class ReadingPlugin extends hyperformula.FunctionPlugin {
  static override implementedFunctions = {
    'READ.CELLS': {
      method: 'readCells',
      parameters: new Array(3).fill({ argumentType: hyperformula.FunctionArgumentType.ANY }),
      vectorizationForbidden: true,
    },
  };

  readCells(call: { args: never[] }, state: never): unknown {
    return this.runFunction(call.args, state, this.metadata('READ.CELLS'), (...given: unknown[]) =>
      given.reduce<number>((size, value) => size + sizeOf(value), 0),
    );
  }
}

/** Sums the numbers and the lengths of the texts; so it changes when K does, as the other's answer does. */
function sizeOf(value: unknown): number {
  if (!(value instanceof hyperformula.SimpleRangeValue)) return measured(value);
  let size = 0;
  for (const row of value.data) for (const cell of row) size += measured(cell);
  return size;
}

function measured(cell: unknown): number {
  return typeof cell === 'number' ? cell : typeof cell === 'string' ? cell.length : 0;
}

function formulas(name: string): Cell[][] {
  return Array.from({ length: FORMULAS }, (_, i) => [
    `=${name}(${EQUATION}, S!$E$1, S!A${4 * i + 1}:C${4 * i + 4})`,
  ]);
}

/** Each answer takes four columns (low, high, middle, Q less K in product form) and a row a step. */
function bisections(): Cell[][] {
  return Array.from({ length: BISECTION_STEPS }, (_, step) =>
    Array.from({ length: BISECTED_ANSWERS }, (__, answer) => bisectionStep(step, 4 * answer)).flat(),
  );
}

function bisectionStep(step: number, firstColumn: number): Cell[] {
  const [low, high, middle, excess] = [0, 1, 2, 3].map((i) => columnLetters(firstColumn + i));
  const row = step + 1;
  const isBelow = `${excess}${step}<0`;
  return [
    step === 0 ? '=-S!$B$3' : `=IF(${isBelow},${middle}${step},${low}${step})`,
    step === 0 ? '=S!$B$1' : `=IF(${isBelow},${high}${step},${middle}${step})`,
    `=(${low}${row}+${high}${row})/2`,
    `=(S!$B$3+${middle}${row})*(S!$B$4+${middle}${row})-S!$E$1*(S!$B$1-${middle}${row})*(S!$B$2-${middle}${row})`,
  ];
}

/** Changes K, so that every formula is worked again. */
function renewal(cells: Cell[][]): () => void {
  const engine = hyperformula.HyperFormula.buildFromSheets(
    { S: amounts(), F: cells },
    { licenseKey: 'gpl-v3', smartRounding: false, precisionEpsilon: 0, useArrayArithmetic: true },
  );
  let K = FIRST_K;
  return () => engine.setCellContents({ sheet: 0, row: 0, col: 4 }, (K += 0.01));
}
