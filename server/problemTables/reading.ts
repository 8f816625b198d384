import type { ErrorTemplate } from '../../functions/errorTable.ts';

/** Errors of a file that cannot be read at all. */
export const READING_ERRORS = {
  'workbook-not-utf8': {
    says: 'the file is not text in UTF-8',
    remedy: 'Save it as UTF-8; a text workbook is a YAML file.',
  },
  // YAML
  'yaml-syntax': {
    says: '{problem}',
    remedy: '{help}',
  },
  'yaml-alias': {
    says: 'the text begins with {sign}, which YAML reads as an anchor or an alias',
    remedy: 'A workbook uses neither; put text that begins with {sign} in quotes.',
  },
  'yaml-tag': {
    says: 'the text begins with !, which YAML reads as the tag {tag}',
    remedy: 'A workbook uses no tags; put text that begins with ! in quotes.',
  },
  'yaml-key': {
    says: '{key} cannot be used as a key',
    remedy: 'A key is a plain word, a name, or an address such as A3, and stands before a colon.',
  },
  'yaml-too-deep': {
    says: 'lists and keys are nested more than {limit} deep',
    remedy:
      'The deepest place of a workbook is {limit} deep; put text that holds brackets, - or : in quotes.',
  },
} as const satisfies Record<string, ErrorTemplate>;
