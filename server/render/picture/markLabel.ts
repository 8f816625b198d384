/** A marked point of the curve with its words beside it, where the rising curve leaves room. */
import { html, type Markup } from '../html.ts';
import { roundedText } from '../numberText.ts';
import type { Frame } from './frame.ts';
import type { CurvePoint } from '../../../functions/equilibrium/extentCurve.ts';

const DIGITS = 5;
/** Widest mean width of a letter at the picture's type size, with room to spare. */
const LETTER_WIDTH = 8;
const GAP = 9;
/** At the plot's edge the curve is steep and the words keep farther away from it. */
const GAP_AT_EDGE = 18;
const LINE = 15;

/**
 * The curve rises, so the free places are above left and below right of a point. `isRightmost` of
 * two points goes above left where its words fit between it and the lowest limit.
 */
export function markLabel(
  plot: Frame,
  point: CurvePoint,
  word: 'feed' | 'equilibrium' | 'end',
  isRightmost: boolean,
  lowest: number,
): Markup {
  const x = plot.x(point.extent);
  const y = Math.min(plot.bottom, Math.max(plot.top, plot.y(point.lnQ)));
  const words = word === 'feed' ? word : `${word} ${roundedText(point.extent, DIGITS)}`;
  const width = words.length * LETTER_WIDTH;
  const isAboveLeft = (isRightmost && x - plot.x(lowest) > width) || x + width > plot.right;
  const gap = y === plot.top || y === plot.bottom ? GAP_AT_EDGE : GAP;
  const labelX = isAboveLeft ? x - gap : x + gap;
  const labelY = isAboveLeft
    ? y === plot.top
      ? y + LINE
      : y - GAP
    : Math.min(y + LINE + 2, plot.bottom - GAP);
  return html`<circle class="mark ${word}" cx="${x}" cy="${y}" r="4.5" />
    <text class="${word}" x="${labelX}" y="${labelY}" text-anchor="${isAboveLeft ? 'end' : 'start'}"
      >${words}</text
    >`;
}
