import { inputError } from '../errors.ts';

export type Phase = 'g' | 'l' | 's' | 'aq';

export interface PhaseTag {
  /** Gas, liquid, solid, dissolved in water; null where no tag is written. */
  readonly phase: Phase | null;
  /** Which solid, such as calcite; null where it is not said. */
  readonly form: string | null;
}

const PHASES: readonly string[] = ['g', 'l', 's', 'aq'];
const NO_TAG: PhaseTag = { phase: null, form: null };

/**
 * The tag at the end of a species text in plain notation: `(g)`, `(l)`, `(s)`, `(aq)`, or a solid
 * with its form, `(s,calcite)`.
 *
 * Errors: phase-unknown, for a last bracket in small letters that is none of these, and for a
 * tag in capitals.
 */
export function splitTag(text: string): { untagged: string; tag: PhaseTag } {
  const last = /^([^]*?) ?\(([^()[\]]*)\)$/.exec(text);
  if (!last || !looksLikeTag(last[2]!)) return { untagged: text, tag: NO_TAG };
  const [phase, form, ...more] = last[2]!.split(',').map((part) => part.trim());
  const isForm = form === undefined || (phase === 's' && /^\p{L}[\p{L}\p{N} _'-]*$/u.test(form));
  if (!PHASES.includes(phase!) || !isForm || more.length > 0) {
    throw inputError('phase-unknown', { text, tag: `(${last[2]})` });
  }
  return { untagged: last[1]!, tag: { phase: phase as Phase, form: form ?? null } };
}

export function printTag({ phase, form }: PhaseTag): string {
  if (phase === null) return '';
  return form === null ? `(${phase})` : `(${phase},${form})`;
}

/** A group of a formula begins with a capital; `(S)` and `(G)` at the end are meant as tags. */
function looksLikeTag(inside: string): boolean {
  return !/^[A-Z]/.test(inside) || PHASES.includes(inside.toLowerCase());
}
