/** Errors of a request to the server, beside what is wrong with the workbook or its inputs. */
import type { ErrorTemplate } from '../../functions/errorTable.ts';

type Errors = Record<string, ErrorTemplate>;

export const UNREADABLE_REQUESTS = {
  'request-unreadable': {
    says: 'the request cannot be read ({reason})',
    remedy: 'Check its address and its headers.',
  },
  'body-unreadable': {
    says: 'the body is no JSON ({reason})',
    remedy: 'Send an object such as {example}.',
  },
} as const satisfies Errors;

export const FOREIGN_REQUESTS = {
  'host-foreign': {
    says: 'the request is addressed to {host}',
    remedy: 'The server answers only at its own address on this computer, {address}.',
  },
  'origin-foreign': {
    says: 'the request was made by a page of {origin}',
    remedy: 'Only the pages of this server itself may ask it.',
  },
} as const satisfies Errors;

export const ABSENT_PAGES = {
  'page-unknown': {
    says: 'there is nothing at {path}',
    remedy: 'The list of all sheets is at /.',
  },
  'workbook-unknown': {
    says: 'no workbook {name} is served',
    remedy: '{nearest}',
  },
} as const satisfies Errors;

export const OTHER_METHODS = {
  'method-unknown': {
    says: '{path} does not take {method}',
    remedy: 'It takes {allowed}.',
  },
} as const satisfies Errors;

export const LARGE_BODIES = {
  'body-too-large': {
    says: 'the body is larger than {limit} bytes',
    remedy: 'Send the name of the workbook and its inputs only.',
  },
} as const satisfies Errors;

export const OTHER_BODIES = {
  'body-kind': {
    says: 'the body is {given}',
    remedy: 'Send JSON in UTF-8 with Content-Type: application/json.',
  },
} as const satisfies Errors;

export const UNFIT_BODIES = {
  'body-shape': {
    says: '{where} does not fit: {problem}',
    remedy: 'Send an object such as {example}.',
  },
} as const satisfies Errors;

export const BUSY_SERVER = {
  'server-busy': {
    says: '{count} evaluations are waiting already',
    remedy: 'Ask again in a while.',
  },
} as const satisfies Errors;
