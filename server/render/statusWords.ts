/** What a status means, in words; the sheet tells states by words alone. */
import type { Outcome, Status } from '../../functions/equilibrium/outcome.ts';
import { html, type Markup } from './html.ts';

const MEANING: Readonly<Record<Status, string>> = {
  settled: 'Q equals K within rounding',
  'at limit': 'Q equals K, with an amount too small to be held as a number',
  exhausted: 'ended before Q reached K',
  blocked: 'nothing can react',
  refused: 'no answer is given',
  'out of time': 'no answer; the best point found is shown',
};

/** `settled: Q equals K within rounding`, with the reason where there is one. */
export function statusSentence({ status, reason }: Outcome): Markup {
  const why = reason === '' ? null : html` (${reason})`;
  return html`<strong class="${isSettled(status) ? 'good' : 'bad'}">${status}</strong>:
    ${MEANING[status]}${why}`;
}

/** Whether Q was brought to K. */
export function isSettled(status: Status): boolean {
  return status === 'settled' || status === 'at limit';
}

/** `settled`, or `198 settled, 2 exhausted`: how many of each, the most frequent first. */
export function statusCounts(outcomes: readonly Outcome[]): Markup {
  const counts = new Map<Status, number>();
  for (const { status } of outcomes) counts.set(status, (counts.get(status) ?? 0) + 1);
  const sorted = [...counts].sort((a, b) => b[1] - a[1]);
  return html`${sorted.map(([status, count], index) => [
    index === 0 ? null : ', ',
    sorted.length === 1 ? null : `${count} `,
    html`<strong class="${isSettled(status) ? 'good' : 'bad'}">${status}</strong>`,
  ])}`;
}
