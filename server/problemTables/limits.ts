import type { ErrorTemplate } from '../../functions/errorTable.ts';

/** Errors of what is larger than the program will take. */
export const SIZE_ERRORS = {
  'workbook-too-large': {
    says: 'the workbook has {size} bytes, and the limit is {limit}',
    remedy: 'Split it into several workbooks.',
  },
  'sheet-too-large': {
    says: 'sheet {sheet} reaches to {cell}, which makes {cells} cells; the limit is {limit} in a workbook',
    remedy: 'Move the blocks towards A1, or split the workbook.',
  },
} as const satisfies Record<string, ErrorTemplate>;

/** Errors of work that takes longer than it may. */
export const TIME_ERRORS = {
  'time-limit': {
    says: '{what} was not evaluated within {seconds} s',
    remedy: 'Allow it more with --time-limit, or look for a formula over a very large range.',
  },
} as const satisfies Record<string, ErrorTemplate>;
