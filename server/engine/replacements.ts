/**
 * Functions in the place of the engine's own: NOW and TODAY give the instant declared for the
 * evaluation, RAND and RANDBETWEEN are errors, and PI has all its digits (the engine's lacks the last).
 */
import { CellError, ErrorType, FunctionPlugin, HyperFormula } from 'hyperformula';
import type { CellPlace } from '../../functions/plugin.ts';
import { serverError } from '../problems.ts';
import type { Session } from './session.ts';

const MILLISECONDS_PER_DAY = 86_400_000;
/** The day number of 1970-01-01, counted from 1899-12-30 as workbooks do. */
const DAY_NUMBER_OF_EPOCH = 25_569;

/** Day number of an instant; the fraction is the time of day in UTC. */
function dayNumber(instant: string): number {
  return Date.parse(instant) / MILLISECONDS_PER_DAY + DAY_NUMBER_OF_EPOCH;
}

class ReplacingFunctions extends FunctionPlugin {
  static override implementedFunctions = {
    NOW: { method: 'now', isVolatile: true },
    TODAY: { method: 'today', isVolatile: true },
    RAND: { method: 'random' },
    RANDBETWEEN: { method: 'random' },
    PI: { method: 'pi' },
  };

  now(): number {
    return dayNumber((this.config.context as Session).readInstant());
  }

  today(): number {
    return Math.floor(this.now());
  }

  pi(): number {
    return Math.PI;
  }

  random(call: { procedureName: string }, state: { formulaAddress: CellPlace }): CellError {
    const error = serverError('random-value', { name: call.procedureName });
    (this.config.context as Session).failed(state.formulaAddress, call, error);
    return new CellError(ErrorType.VALUE, error.message);
  }
}

/** Puts them in the place of the engine's own, for every engine built after this. */
export function registerReplacements(): void {
  const names = Object.keys(ReplacingFunctions.implementedFunctions);
  const translations = Object.fromEntries(names.map((name) => [name, name]));
  HyperFormula.registerFunctionPlugin(ReplacingFunctions, { enGB: translations });
}
