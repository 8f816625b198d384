const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹⁺⁻';
const SUBSCRIPTS = '₀₁₂₃₄₅₆₇₈₉';
const PLAIN = '0123456789+-';

/**
 * The text in plain notation: raised figures after `^`, lowered figures on the line, one kind of
 * minus sign and of middle dot, single spaces. What people paste from a document reads like what
 * they type: `SO₄²⁻` is `SO4^2-`.
 */
export function plainNotation(text: string): string {
  return text
    .normalize('NFC')
    .replace(/\^?[⁰¹²³⁴⁵⁶⁷⁸⁹⁺⁻]+/g, (run) => `^${exchange(run.replace('^', ''), SUPERSCRIPTS)}`)
    .replace(/[₀₁₂₃₄₅₆₇₈₉]/g, (figure) => exchange(figure, SUBSCRIPTS))
    .replace(/[−–]/g, '-')
    .replace(/[•∙⋅‧・]/g, '·')
    .replace(/\s+/g, ' ')
    .trim();
}

function exchange(run: string, alphabet: string): string {
  return run.replace(/./gu, (figure) => PLAIN[alphabet.indexOf(figure)]!);
}
