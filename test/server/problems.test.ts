import { describe, expect, it } from 'vitest';
import { errorTable } from '../../functions/errors.ts';
import { answerTo, serverError, serverErrorTable } from '../../server/problems.ts';

describe('the errors of the server side', () => {
  const table = serverErrorTable();

  it('share no code with those of the cell functions', () => {
    const cellCodes = new Set<string>(errorTable().map(({ code }) => code));
    expect(table.filter(({ code }) => cellCodes.has(code))).toEqual([]);
  });

  it('say what is wrong as the beginning of a sentence and how to mend it as one', () => {
    expect(table.filter(({ says }) => /^[A-Z]|[.]$/.test(says))).toEqual([]);
    expect(table.filter(({ remedy }) => !/^(?:[A-Z].*\.|\{.*)$/s.test(remedy))).toEqual([]);
  });

  it('end a command with 2 where nothing was evaluated, and with 1 where a cell failed', () => {
    expect(answerTo('yaml-syntax')).toEqual({ exit: 2, http: 400 });
    expect(answerTo('input-unit')).toEqual({ exit: 2, http: 422 });
    expect(answerTo('workbook-too-large')).toEqual({ exit: 2, http: 413 });
    expect(answerTo('time-limit')).toEqual({ exit: 2, http: 422 });
    expect(answerTo('formula-too-deep')).toEqual({ exit: 1, http: 422 });
  });

  it('take an error of a cell function for one in a cell', () => {
    expect(answerTo('argument-kind')).toEqual({ exit: 1, http: 422 });
    expect(answerTo('constructor')).toEqual({ exit: 1, http: 422 });
  });

  it('are filled in', () => {
    const error = serverError('input-formula', { name: 'acid', cell: 'Kettle!B4' });
    expect(error).toMatchObject({
      code: 'input-formula',
      message:
        'input acid points at Kettle!B4, which holds a formula. Point it at a cell with a value; a formula would be overwritten.',
    });
  });
});
