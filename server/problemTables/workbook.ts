import type { ErrorTemplate } from '../../functions/errorTable.ts';

/** Errors of a workbook that can be read but does not hold together. */
export const WORKBOOK_ERRORS = {
  'yaml-key-twice': {
    says: 'the key {key} stands twice in the same place',
    remedy: 'Keep one of the two.',
  },
  'yaml-number': {
    says: '{text} would be read as {number}',
    remedy:
      'Write it as a plain decimal number, a large one with an exponent (1e20); or put it in quotes, if the text is meant.',
  },
  'yaml-comma-number': {
    says: '{text} looks like a number with a comma',
    remedy:
      'Numbers have a decimal point and no grouping: 1.5, 1000. Put it in quotes, if the text is meant.',
  },
  'yaml-formula-unquoted': {
    says: 'the formula {formula} is not in quotes, so YAML may have cut it at a comma, a " #" or a ": "',
    remedy: "Put the whole formula in single quotes: '=A1+B1'.",
  },
  'yaml-control-character': {
    says: 'the text holds the character {character}, which cannot be shown',
    remedy: 'Take it out; it may have come in with a paste.',
  },
  // the shape of a workbook
  'workbook-version': {
    says: 'the workbook does not begin with its version, `workbook: 1`',
    remedy:
      'Write `workbook: 1` in its first line, and each further key with its colon on a line of its own.',
  },
  'workbook-key': {
    says: '{where} has no item called {key}',
    remedy: '{nearest}',
  },
  'workbook-missing': {
    says: '{where} has no {key}',
    remedy: 'Give {wanted}.',
  },
  'workbook-item': {
    says: '{where} is {given}',
    remedy: 'Give {wanted}.',
  },
  // sheets
  'sheet-name': {
    says: 'a sheet cannot be called {name}',
    remedy: 'Use 1 to {limit} characters, none of them : \\ / ? * [ ] and no apostrophe at either end.',
  },
  'sheet-name-twice': {
    says: 'the sheets {first} and {second} differ only in capitals',
    remedy: 'Formulas do not tell them apart: give one another name.',
  },
  'sheet-address': {
    says: '{address} is no cell or range of a sheet',
    remedy: 'Write the first cell of a block, such as A3, or the range that a formula fills, such as G4:G7.',
  },
  'cell-empty': {
    says: '{address} has no value',
    remedy: 'Give it one or leave it out; text that begins with # must be in quotes.',
  },
  'cell-mapping': {
    says: '{where} is read as a key and a value',
    remedy: 'Put text that holds ": " or begins with ? in quotes.',
  },
  'block-rows': {
    says: 'item {row} of the block {address} is no row',
    remedy:
      'A block is a list of rows and each row is a list: `- [a, b]` is one row, `- [a]` a row of one cell.',
  },
  'block-row-too-long': {
    says: 'row {row} of the block {address} has {found} items, and its first row has {expected}',
    remedy:
      'A comma inside an item splits it (write 1.5, not 1,5; put text and formulas in quotes). A title above a table has an address of its own.',
  },
  'block-in-range': {
    says: 'the range {address} is given a list',
    remedy:
      'A range takes one formula or one value for all its cells. Write a block at its first cell: {first}.',
  },
  'block-off-sheet': {
    says: 'the block {address} reaches beyond the last row or column of a sheet',
    remedy: 'Move it towards A1.',
  },
  'block-overlap': {
    says: '{second} and {first} both give a value to {cell}',
    remedy: 'Move or shorten one of them.',
  },
  'fill-off-sheet': {
    says: 'filled into {cell}, the reference {reference} would lie outside the sheet',
    remedy: 'Fix it with $ signs, or fill a smaller range.',
  },
  // names, inputs, outputs, checks
  'name-word': {
    says: '{name} cannot be a name',
    remedy:
      'A name is letters, digits and _, begins with a letter or _, and is neither TRUE nor FALSE nor like a cell (K1, R1C1): K_1 is one.',
  },
  'item-name': {
    says: '{name} cannot be the name of an input or output',
    remedy: 'Use letters, digits, _, - and points, beginning with a letter or _.',
  },
  'name-twice': {
    says: 'the name {second} is taken by {first}',
    remedy: 'Give one of them another name; capitals make no difference.',
  },
  'reference-form': {
    says: '{where} points at {reference}, which is no address on a sheet',
    remedy: "Write the sheet and the cell or range: Kettle!B4, Kettle!A3:C7, 'Feed tank'!B4.",
  },
  'reference-sheet': {
    says: '{where} points at the sheet {sheet}, which is not in the workbook',
    remedy: '{nearest}',
  },
  'input-range': {
    says: 'input {name} points at {reference}, which is more than one cell',
    remedy: 'Point it at one cell; give each cell an input of its own.',
  },
  'input-formula': {
    says: 'input {name} points at {cell}, which holds a formula',
    remedy: 'Point it at a cell with a value; a formula would be overwritten.',
  },
  'input-blank': {
    says: 'input {name} points at {cell}, which is blank',
    remedy: 'Give the cell the value that holds where none is set, or mend the address.',
  },
  'input-limits': {
    says: 'input {name}: {problem}',
    remedy: '{help}',
  },
  'input-unit': {
    says: 'input {name} is in {unit}, but the cell beside {cell} says {beside}',
    remedy: 'Write the same unit in both.',
  },
  'check-name': {
    says: 'check {check} names {name}, which is no {kind} of the workbook',
    remedy: '{nearest}',
  },
  'check-given': {
    says: 'check {check} sets {name} to {value}, outside its limits {min} to {max}',
    remedy: 'Mend the value or the limits.',
  },
  'check-tolerance': {
    says: 'check {check} expects a number for {name} but does not say how near',
    remedy: 'Give `within: 0.001` or `within: 0.1 %`, or one for each output by its name.',
  },
  'check-empty': {
    says: 'check {check} expects nothing',
    remedy: 'Name an output under `expect`, with what it should show.',
  },
  'check-zero': {
    says: 'check {check} expects 0 for {name} within a share of it, and a share of 0 allows nothing',
    remedy: 'Give an absolute tolerance, such as `within: 0.001`.',
  },
  'check-block': {
    says: 'check {check} expects {found} of {name}, whose cells take {expected}',
    remedy: 'Give a value for a cell, and a list of rows of the same size for a range.',
  },
} as const satisfies Record<string, ErrorTemplate>;
