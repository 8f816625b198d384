/**
 * An error cell of the engine as a code and a message of ours.
 */
import { type DetailedCellError, ErrorType } from 'hyperformula';
import { catalogue } from '../../functions/catalogue.ts';
import { nearestSpelling } from '../../functions/chemistry/units/nearestSpelling.ts';
import type { CellPlace } from '../../functions/plugin.ts';
import type { ErrorValue } from '../evaluation.ts';
import { type ServerErrorCode, serverError } from '../problems.ts';
import type { Session } from './session.ts';

/** Codes for the engine's own kinds of error, whose names are those of its `ErrorType`. */
const CODES: Readonly<Record<string, ServerErrorCode>> = {
  DIV_BY_ZERO: 'division-by-zero',
  VALUE: 'wrong-kind',
  NUM: 'number-range',
  NA: 'not-available',
  CYCLE: 'cycle',
  REF: 'reference-lost',
  SPILL: 'array-blocked',
  ERROR: 'formula-unparsed',
};

/**
 * The error of a cell; `origin` is where it began, whose calls tell whether it is one of ours.
 */
export function errorValue(error: DetailedCellError, origin: CellPlace, session: Session): ErrorValue {
  const own = session.errorAt(origin, error.message);
  if (own !== undefined) return { error: own.code, message: own.message };
  if (error.type === ErrorType.NAME) return unknownFunction(error);
  const code = CODES[error.type] ?? 'wrong-kind';
  return { error: code, message: serverError(code as 'wrong-kind', { detail: detailOf(error) }).message };
}

/** The engine gives the name within a sentence of its own. */
function unknownFunction({ message, value }: DetailedCellError): ErrorValue {
  const name = /^Function name (.+) not recognized/.exec(message)?.[1] ?? value;
  const spelling = nearestSpelling(
    name,
    catalogue.map((known) => known.name),
  );
  const nearest = spelling === null ? 'Check its spelling.' : `Did you mean ${spelling}?`;
  const code = 'unknown-function';
  return { error: code, message: serverError(code, { name, nearest }).message };
}

/** What the engine says, without the names of its parser's own tokens. */
function detailOf({ type, message, value }: DetailedCellError): string {
  if (type !== ErrorType.ERROR) return message.replace(/\.$/, '') || value;
  if (message.includes('RParen')) return 'a closing bracket is missing';
  const surplus = /expecting EOF but found: (.+)/.exec(message);
  return surplus === null ? 'something is missing or out of place' : `${surplus[1]} was not expected`;
}
