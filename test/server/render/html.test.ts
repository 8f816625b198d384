import fc from 'fast-check';
import { expect, test } from 'vitest';
import { html } from '../../../server/render/html.ts';
import { readStrictly } from './wellFormed.ts';

test('a text is escaped between tags and inside quotes', () => {
  const text = `<b title="x">&'`;
  expect(html`<p title="${text}">${text}</p>`.markup).toBe(
    '<p title="&lt;b title=&quot;x&quot;&gt;&amp;&#39;">&lt;b title=&quot;x&quot;&gt;&amp;&#39;</p>',
  );
});

test('markup is kept, lists are joined, null leaves nothing', () => {
  const items = [html`<i>${1}</i>`, null, html`<i>b</i>`];
  expect(html`<b>${items}</b>`.markup).toBe('<b><i>1</i><i>b</i></b>');
});

test('characters that no XML document may hold are replaced', () => {
  expect(html`${'a\u0000b\u001Fc\uD800d\uFFFF'}`.markup).toBe('a\uFFFDb\uFFFDc\uFFFDd\uFFFD');
});

test('no text breaks out of its element', () => {
  fc.assert(
    fc.property(fc.string({ unit: 'binary' }), (text) => {
      expect(readStrictly(html`<p title="${text}">${text}</p>`.markup).faults).toEqual([]);
    }),
    { seed: 20261201, numRuns: 300 },
  );
});
