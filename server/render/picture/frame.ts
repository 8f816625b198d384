/** The plot's frame: its size on the page, both scales, and the axes with quantity and unit. */
import { scaleLinear } from 'd3-scale';
import { html, type Markup } from '../html.ts';
import { numberText } from '../numberText.ts';

export interface Frame {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  /** Places on the page; values outside the shown range land just outside the plot. */
  readonly x: (extent: number) => number;
  readonly y: (lnQ: number) => number;
  readonly axes: (unit: string) => Markup;
}

const WIDTH = 478;
const HEIGHT = 290;
const MARGIN = { left: 64, right: 96, top: 30, bottom: 48 };
/** Part of the range added at each end. */
const PADDING = 0.12;
/** As much at an end where an infinite value is marked. */
const PADDING_AT_INFINITY = 0.3;
/** A level curve still gets a range of this height, in ln units. */
const LEAST_HEIGHT = 2;
const TICKS = 5;
const TICK_LENGTH = 5;
/** How far outside the plot a point may lie, so that paths stay short numbers. */
const OUTSIDE = 40;

/** `lnQs` are to be in sight; an infinite one is marked at the plot's edge and gets room there. */
export function frame(extents: readonly [number, number], lnQs: readonly number[]): Frame {
  const left = MARGIN.left;
  const right = WIDTH - MARGIN.right;
  const top = MARGIN.top;
  const bottom = HEIGHT - MARGIN.bottom;
  const xScale = scaleLinear(padded(extents, 0), [left, right]);
  const yScale = scaleLinear(padded(lnQs, LEAST_HEIGHT), [bottom, top]);
  const x = (extent: number) => rounded(xScale(extent));
  const y = (lnQ: number) => {
    if (!Number.isFinite(lnQ)) return lnQ > 0 ? top - OUTSIDE : bottom + OUTSIDE;
    return rounded(Math.min(bottom + OUTSIDE, Math.max(top - OUTSIDE, yScale(lnQ))));
  };

  const axes = (unit: string) =>
    html`<path class="axis" d="M${left},${top}V${bottom}H${right}" /> ${xScale.ticks(TICKS).map(
        (tick) =>
          html`<line
              class="axis"
              x1="${x(tick)}"
              x2="${x(tick)}"
              y1="${bottom}"
              y2="${bottom + TICK_LENGTH}"
            />
            <text x="${x(tick)}" y="${bottom + 19}" text-anchor="middle">${numberText(tick)}</text> `,
      )}${yScale.ticks(TICKS).map(
        (tick) =>
          html`<line class="axis" x1="${left - TICK_LENGTH}" x2="${left}" y1="${y(tick)}" y2="${y(tick)}" />
            <text x="${left - 9}" y="${y(tick) + 4}" text-anchor="end">${numberText(tick)}</text> `,
      )}<text x="${(left + right) / 2}" y="${HEIGHT - 8}" text-anchor="middle"
        >extent <tspan class="quantity">&#958;</tspan> / ${unit}</text
      >
      <text transform="translate(14 ${(top + bottom) / 2}) rotate(-90)" text-anchor="middle"
        >ln <tspan class="quantity">Q</tspan></text
      >`;

  return { width: WIDTH, height: HEIGHT, left, right, top, bottom, x, y, axes };
}

function padded(values: readonly number[], least: number): [number, number] {
  const finite = values.filter(Number.isFinite);
  const low = Math.min(...finite);
  const high = Math.max(...finite);
  const missing = Math.max(0, (least - (high - low)) / 2);
  const paddingAt = (end: number) =>
    (values.includes(end) ? PADDING_AT_INFINITY : PADDING) * (high - low) + missing;
  return [low - paddingAt(-Infinity), high + paddingAt(Infinity)];
}

function rounded(pixels: number): number {
  return Math.round(pixels * 100) / 100;
}
