/** The picture of a solved reaction: ln Q against extent, with the level of K and the feasible limits. */
import { line } from 'd3-shape';
import { quotientCurve, type CurvePoint } from '../../../functions/equilibrium/extentCurve.ts';
import type { ExtentOutcome } from '../../../functions/equilibrium/extentOutcome.ts';
import { reactionQuotient } from '../../../functions/equilibrium/quotient.ts';
import { html, type Markup } from '../html.ts';
import { numberText, roundedText } from '../numberText.ts';
import { frame, type Frame } from './frame.ts';
import { markLabel } from './markLabel.ts';

/** How far into the range, from either limit, the curve is always shown. */
const SHOWN_FROM = 0.02;
const LABEL_DIGITS = 4;
/** Farther apart two labels at line ends do not touch. */
const LABEL_HEIGHT = 17;

/** `id` is unique on the page; null where the feed leaves no range to draw, or there is no answer. */
export function extentPicture(outcome: ExtentOutcome, id: string): Markup | null {
  const { problem, limits, extent } = outcome;
  const unit = problem.unit ?? null;
  const [lowest, highest] = limits;
  if (!(lowest < highest) || !Number.isFinite(extent)) return null;
  const meetsK = outcome.status === 'settled' || outcome.status === 'at limit';
  const curve = quotientCurve(problem);
  const end = { extent, lnQ: meetsK ? problem.lnK : nearest(curve, extent).lnQ };
  const feed = feedPoint(outcome);
  const shown = [problem.lnK, end.lnQ, ...inner(curve, limits).map(({ lnQ }) => lnQ)];
  const plot = frame(limits, feed === null ? shown : [...shown, feed.lnQ]);

  return html`<figure class="picture">
    <svg viewBox="0 0 ${plot.width} ${plot.height}" role="img" aria-labelledby="${id}-title ${id}-desc">
      <title id="${id}-title">ln Q against extent, with the level of K</title>
      <desc id="${id}-desc">${description(outcome, unit, meetsK)}</desc>
      <clipPath id="${id}-clip">
        <rect
          x="${plot.left}"
          y="${plot.top}"
          width="${plot.right - plot.left}"
          height="${plot.bottom - plot.top}"
        />
      </clipPath>
      ${plot.axes(unit ?? 'unit of the amounts')}
      ${limitLine(plot, lowest, 'lowest', 'start')}${limitLine(plot, highest, 'highest', 'end')}
      <line
        class="level"
        x1="${plot.left}"
        x2="${plot.right}"
        y1="${plot.y(problem.lnK)}"
        y2="${plot.y(problem.lnK)}"
      />
      <path class="curve" clip-path="url(#${id}-clip)" d="${curvePath(plot, withPoint(curve, end))}" />
      ${endLabels(plot, curve, problem.lnK)}
      ${feed === null ? null : markLabel(plot, feed, 'feed', feed.extent > extent, lowest)}
      ${markLabel(plot, end, meetsK ? 'equilibrium' : 'end', feed === null || feed.extent <= extent, lowest)}
    </svg>
  </figure>`;
}

function feedPoint({ problem, limits: [lowest, highest] }: ExtentOutcome): CurvePoint | null {
  if (lowest > 0 || highest < 0) return null;
  const { lnQ, absentReactants } = reactionQuotient(problem);
  return { extent: 0, lnQ: lnQ ?? (absentReactants.length === 0 ? -Infinity : Infinity) };
}

function curvePath(plot: Frame, points: readonly CurvePoint[]): string {
  const path = line<CurvePoint>(
    ({ extent }) => plot.x(extent),
    ({ lnQ }) => plot.y(lnQ),
  ).digits(2);
  return path(points) ?? '';
}

function withPoint(curve: readonly CurvePoint[], point: CurvePoint): CurvePoint[] {
  return [...curve, point].sort((a, b) => a.extent - b.extent || a.lnQ - b.lnQ);
}

function nearest(curve: readonly CurvePoint[], extent: number): CurvePoint {
  return curve.reduce((best, point) =>
    Math.abs(point.extent - extent) < Math.abs(best.extent - extent) ? point : best,
  );
}

function inner(curve: readonly CurvePoint[], [lowest, highest]: readonly [number, number]): CurvePoint[] {
  const edge = SHOWN_FROM * (highest - lowest);
  return curve.filter(({ extent }) => extent >= lowest + edge && extent <= highest - edge);
}

function limitLine(plot: Frame, extent: number, word: string, anchor: 'start' | 'end'): Markup {
  const x = plot.x(extent);
  return html`<line class="limit" x1="${x}" x2="${x}" y1="${plot.top}" y2="${plot.bottom}" />
    <text x="${x}" y="${plot.top - 8}" text-anchor="${anchor}"
      >${word} ${roundedText(extent, LABEL_DIGITS)}</text
    >`;
}

/** The names of both lines where they leave the plot, moved apart where they would touch. */
function endLabels(plot: Frame, curve: readonly CurvePoint[], lnK: number): Markup {
  const levelY = plot.y(lnK);
  const curveY = Math.max(plot.top, plot.y(curve.at(-1)?.lnQ ?? lnK));
  const apart =
    curveY <= levelY ? Math.min(curveY, levelY - LABEL_HEIGHT) : Math.max(curveY, levelY + LABEL_HEIGHT);
  const x = plot.right + 8;
  return html`<text class="level-label" x="${x}" y="${levelY + 4}"
      >ln <tspan class="quantity">K</tspan> = ${roundedText(lnK, LABEL_DIGITS)}</text
    >
    <text x="${x}" y="${apart + 4}">ln <tspan class="quantity">Q</tspan></text>`;
}

function description(outcome: ExtentOutcome, unit: string | null, meetsK: boolean): string {
  const { problem, limits, extent } = outcome;
  const lnK = numberText(problem.lnK);
  const inUnit = unit === null ? '' : ` ${unit}`;
  const where = `an extent of ${numberText(extent)}${inUnit}`;
  const range = `Feasible extents lie between ${numberText(limits[0])} and ${numberText(limits[1])}${inUnit}.`;
  const meeting = meetsK
    ? `It meets the level of K, ln K = ${lnK}, at ${where}.`
    : `It does not meet the level of K, ln K = ${lnK}: the reaction ends at ${where}.`;
  return `ln Q against the extent. ${meeting} ${range}`;
}
