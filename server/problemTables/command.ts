/** Errors of what stands on a command line or in a request, beside the workbook. */
import type { ErrorTemplate } from '../../functions/errorTable.ts';

export const COMMAND_ERRORS = {
  'given-unknown': {
    says: 'the workbook has no input {name}',
    remedy: '{nearest}',
  },
  'given-kind': {
    says: 'the input {name} is a number, and {value} is none',
    remedy: 'Give a number with a decimal point.',
  },
  'given-limits': {
    says: 'the input {name} is {value}, outside its limits {lowest} to {highest}',
    remedy: 'Give a value inside the limits, or change them in the workbook.',
  },
  'given-form': {
    says: '--set {text} is no name and value',
    remedy: 'Write --set acid=1.5, and --set again for the next input.',
  },
  'given-twice': {
    says: 'the input {name} is given twice',
    remedy: 'Keep one of the two.',
  },
  // files
  'file-unreadable': {
    says: '{file} cannot be read: {reason}',
    remedy: 'Check its name and its folder.',
  },
  'save-ending': {
    says: '{file} does not end with {endings}',
    remedy: 'The ending chooses what is written: .html the page, .json the evaluation.',
  },
  'save-failed': {
    says: '{file} cannot be written: {reason}',
    remedy: 'Check its folder, and that you may write there.',
  },
  // functions
  'function-unknown': {
    says: 'there is no function {name}',
    remedy: '{nearest}',
  },
  'own-functions-file': {
    says: '{file} cannot be loaded as a file of functions: {reason}',
    remedy: 'It is a JavaScript module: its name ends with .mjs, or with .js in a package of type module.',
  },
  'own-functions-none': {
    says: '{file} exports no function',
    remedy: 'Export what defineFunction gives: export const half = defineFunction(...).',
  },
  'own-functions-entry': {
    says: 'the function {export} of {file} has {problem}',
    remedy: 'Make it by defineFunction, which says what a function needs.',
  },
  // serving
  'served-twice': {
    says: '{first} and {second} would both be shown as {name}',
    remedy: 'Give one of the files another name.',
  },
  'port-unusable': {
    says: 'port {port} cannot be used: {reason}',
    remedy: 'Choose another one with --port, or --port 0 for any that is free.',
  },
} as const satisfies Record<string, ErrorTemplate>;
