/** One line that says what a sample workbook gave: its outputs, and how many of its checks passed. */

/** Digits enough to recognise a result; the page shows the rest. */
const SHOWN_DIGITS = 6;

/**
 * @typedef {number | string | boolean | null | { error: string, message: string }} Value
 * @typedef {{ value: Value | Value[][], unit?: string | null }} Output
 * @typedef {{ workbook: { title: string }, outputs: Record<string, Output>, checks: { passed: boolean }[] }} Evaluation
 */

/**
 * @param {string} file
 * @param {Evaluation} evaluation as `evenkeel evaluate --json` prints it
 */
export function sampleLine(file, { workbook, outputs, checks }) {
  const results = Object.entries(outputs).map(([name, output]) => `${name} ${shown(output)}`);
  const passed = checks.filter((check) => check.passed).length;
  return `${file}: ${workbook.title}: ${results.join(', ')}; checks: ${passed} of ${checks.length} passed`;
}

/** @param {Output} output */
function shown({ value, unit }) {
  if (typeof value === 'number') return `${Number(value.toPrecision(SHOWN_DIGITS))} ${unit ?? ''}`.trimEnd();
  if (Array.isArray(value)) return `${value.length} x ${value[0]?.length} cells`;
  if (typeof value === 'object' && value !== null) return `error ${value.error}`;
  return String(value);
}
