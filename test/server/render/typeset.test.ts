import { expect, test } from 'vitest';
import { parseEquation } from '../../../functions/chemistry/equation.ts';
import { equationTex } from '../../../server/render/typeset/equationTex.ts';
import { equationMarkup, speciesMarkup } from '../../../server/render/typeset/mathml.ts';
import { readStrictly } from './wellFormed.ts';

// The notation of formulas, charges and state symbols after IUPAC, Quantities, Units and Symbols in
// Physical Chemistry (2007), section 2.10, from memory.
test.each([
  [
    'N2(g) + 3 H2(g) = 2 NH3(g)',
    '\\text{N}_{2}\\text{(g)} + 3\\,\\text{H}_{2}\\text{(g)} \\rightleftharpoons 2\\,\\text{NH}_{3}\\text{(g)}',
  ],
  [
    '1/2 O2 + 2 H+ + 2 e^- -> H2O',
    '\\tfrac{1}{2}\\,\\text{O}_{2} + 2\\,\\text{H}^{+} + 2\\,\\text{e}^{-} \\rightleftharpoons \\text{H}_{2}\\text{O}',
  ],
  [
    'Ca^2+(aq) + SO4^2-(aq) = CaSO4·2H2O(s)',
    '\\text{Ca}^{2+}\\text{(aq)} + \\text{SO}_{4}^{2-}\\text{(aq)} \\rightleftharpoons \\text{CaSO}_{4}\\cdot 2\\,\\text{H}_{2}\\text{O}\\text{(s)}',
  ],
  [
    'CaCO3(s,calcite) <=> CaO(s) + CO2(g)',
    '\\text{CaCO}_{3}\\text{(s, calcite)} \\rightleftharpoons \\text{CaO}\\text{(s)} + \\text{CO}_{2}\\text{(g)}',
  ],
  [
    'acid + alcohol = ester + water',
    '\\text{acid} + \\text{alcohol} \\rightleftharpoons \\text{ester} + \\text{water}',
  ],
  ['Fe0.947O(s) = A', '\\text{Fe}_{0.947}\\text{O}\\text{(s)} \\rightleftharpoons \\text{A}'],
  [
    '[Fe(CN)6]^4- = A',
    '\\text{[}\\text{Fe}\\text{(}\\text{CN}\\text{)}_{6}\\text{]}^{4-} \\rightleftharpoons \\text{A}',
  ],
])('%s', (text, tex) => {
  expect(equationTex(parseEquation(text))).toBe(tex);
});

test('MathML has fractions, subscripts, raised charges and the double harpoon', () => {
  const markup = equationMarkup('1/2 O2(g) + SO4^2- = CO3^2- + Na+')!.markup;
  expect(markup).toContain('<mfrac><mn>1</mn><mn>2</mn></mfrac>');
  expect(markup).toContain('<msub><mtext>O</mtext><mn>2</mn></msub><mtext>(g)</mtext>');
  expect(markup).toMatch(
    /<msubsup><mtext>SO<\/mtext><mn>4<\/mn><mrow><mn>2<\/mn><mo[^>]*>\u2212<\/mo><\/mrow><\/msubsup>/,
  );
  expect(markup).toMatch(/<msup><mtext>Na<\/mtext><mo[^>]*>\+<\/mo><\/msup>/);
  expect(markup).toContain('\u21CC');
  expect(readStrictly(markup).faults).toEqual([]);
});

test('a text that is no equation is not typeset', () => {
  expect(equationMarkup('1 = 2')).toBeNull();
  expect(equationMarkup('amounts in mol')).toBeNull();
});

test('a label that is no species stands as it was written', () => {
  expect(speciesMarkup('<x>').markup).toBe('&lt;x&gt;');
});
