/**
 * Markup that cannot be broken by a workbook: a tagged template escapes every text put into it.
 *
 * What it makes is HTML that also reads as XML: void elements are closed, attributes are quoted.
 */

/** Text that is markup already. Only this file and `verbatim` make one. */
export interface Markup {
  readonly markup: string;
}

export type Part = Markup | string | number | null | readonly Part[];

const ESCAPES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** What no XML 1.0 document may hold (production 2, Char): controls, lone surrogates, two non-characters. */
const NOT_A_CHARACTER = /[\0-\x08\x0B\x0C\x0E-\x1F\uFFFE\uFFFF]|\p{Surrogate}/gu;

/** `html`<td>${text}</td>`` with every text escaped, lists joined and null left out. */
export function html(strings: TemplateStringsArray, ...parts: readonly Part[]): Markup {
  return { markup: strings.map((text, index) => text + written(parts[index] ?? null)).join('') };
}

/** Markup made by something that escapes on its own, such as the MathML writer. */
export function verbatim(markup: string): Markup {
  return { markup };
}

/** The text with the characters of markup written as entities. */
function escaped(text: string): string {
  return text.replace(NOT_A_CHARACTER, '\uFFFD').replace(/[&<>"']/g, (character) => ESCAPES[character] ?? '');
}

/** Parts with a separator between them, null left out. */
export function joined(parts: readonly Part[], separator: Part): Part {
  return parts
    .filter((part) => part !== null)
    .flatMap((part, index) => (index === 0 ? [part] : [separator, part]));
}

function written(part: Part): string {
  if (part === null) return '';
  if (typeof part === 'string') return escaped(part);
  if (typeof part === 'number') return String(part);
  return 'markup' in part ? part.markup : part.map(written).join('');
}
