import { expect, test } from 'vitest';
import { remember } from '../../../functions/chemistry/remember.ts';
import { inputError } from '../../../functions/errors.ts';

test('a text is read once', () => {
  const texts: string[] = [];
  const read = remember((text) => ({ length: texts.push(text) }));
  expect(read('a')).toBe(read('a'));
  expect(texts).toEqual(['a']);
});

test('an error of the input is remembered too, and raised each time', () => {
  let times = 0;
  const read = remember((text) => {
    times += 1;
    throw inputError('isotope', { text });
  });
  expect(() => read('D2O')).toThrow('D2O');
  expect(() => read('D2O')).toThrow('D2O');
  expect(times).toBe(1);
});

test('a full cache is emptied, and gives the same results', () => {
  let times = 0;
  const read = remember((text) => ({ text, times: (times += 1) }), 3);
  for (const text of ['a', 'b', 'c', 'd', 'a']) expect(read(text).text).toBe(text);
  expect(times).toBe(5);
});

test('a long text is not kept', () => {
  let times = 0;
  const read = remember(() => ({ times: (times += 1) }));
  const long = 'a'.repeat(1001);
  read(long);
  read(long);
  expect(times).toBe(2);
});
