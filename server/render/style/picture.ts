/** The picture: told apart by the kind of line first; only the level of K carries the accent. */
export const PICTURE = `.picture { margin-top: 1rem; max-width: 31rem; }
.picture svg { display: block; width: 100%; height: auto; overflow: visible; font: 13px/1 inherit; font-family: inherit; fill: var(--ink); }
.picture text { paint-order: stroke; stroke: var(--paper); stroke-width: 4px; stroke-linejoin: round; }
.picture line, .picture path { fill: none; stroke: var(--ink); }
.picture .axis { stroke-width: 1; }
.picture .curve { stroke-width: 2; }
.picture .level { stroke: var(--accent); stroke-width: 1.5; stroke-dasharray: 9 4; }
.picture .level-label { fill: var(--accent); }
.picture .limit { stroke-width: 1; stroke-dasharray: 1 4; stroke-linecap: round; }
.picture .quantity { font-style: italic; }
.picture .mark { fill: var(--ink); stroke: var(--paper); stroke-width: 1.5; }
.picture .mark.feed { fill: var(--paper); stroke: var(--ink); }
.picture .mark.equilibrium { fill: var(--accent); }
.picture text.equilibrium, .picture text.end { font-weight: 600; }`;
