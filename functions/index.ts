/**
 * What an own-functions file needs: `defineFunction`, the readers of arguments, and `InputError` with a
 * code of its own: `throw new InputError('plant-brine', 'the share is above 0.25. Give less.')`.
 */
export { defineFunction } from './cells/entry.ts';
export type {
  Answer,
  CellFunction,
  CellScalar,
  CellTable,
  CellValue,
  Example,
  Parameter,
  Shape,
} from './cells/entry.ts';
export { AMOUNTS, CONDITIONS, CONSTANT, EQUATION } from './cells/parameters/common.ts';
export { number, positiveNumber } from './cells/parameters/number.ts';
export { optional, repeated } from './cells/parameters/optional.ts';
export { text } from './cells/parameters/text.ts';
export { InputError } from './errors.ts';
