/** A species as TeX: subscripts, charge, hydrate dots, phase tag; a name without composition as words. */
import type { Species } from '../../../functions/chemistry/species.ts';

const WRITTEN_CHARGE = /(?:\^\d*)?[+-]$/;
/** Letters, a number (`2`, `0.947`, `1/2`), a closing bracket, or any other character. */
const PIECE = /([A-Za-z]+)|(\d+(?:[./]\d+)?)|([)\]])|([^])/gu;
const TEX_SIGNS: Readonly<Record<string, string>> = {
  '\\': '\\textbackslash{}',
  '~': '\\textasciitilde{}',
  '^': '\\textasciicircum{}',
};

/** `SO4^2-(aq)` as `\text{SO}_{4}^{2-}\text{(aq)}`. */
export function speciesTex({ name, atoms, charge, phase, form }: Species): string {
  const body = charge ? name.replace(WRITTEN_CHARGE, '') : name;
  const tag = form === null ? phase : `${phase}, ${form}`;
  return (
    (atoms === null ? textTex(body) : formulaTex(body)) +
    chargeTex(charge ?? 0) +
    (tag === null ? '' : textTex(`(${tag})`))
  );
}

/** Any text as TeX that shows exactly that text. */
function textTex(text: string): string {
  const inside = text.replace(/[\\~^{}$&#_%]/g, (sign) => TEX_SIGNS[sign] ?? `\\${sign}`);
  return `\\text{${inside}}`;
}

/** A number counts what stands before it; after a dot or at the beginning it multiplies what follows. */
function formulaTex(formula: string): string {
  let tex = '';
  let isAfterUnit = false;
  for (const [piece, letters, number, closing] of formula.matchAll(PIECE)) {
    if (number !== undefined) tex += isAfterUnit ? `_{${number}}` : `${number}\\,`;
    else tex += piece === '\u00B7' ? '\\cdot ' : textTex(piece);
    isAfterUnit = letters !== undefined || closing !== undefined;
  }
  return tex;
}

function chargeTex(charge: number): string {
  if (charge === 0) return '';
  const size = Math.abs(charge) === 1 ? '' : Math.abs(charge);
  return `^{${size}${charge > 0 ? '+' : '-'}}`;
}
