/** Type, the title block, tables and states. */
export const SHEET = `* { box-sizing: border-box; }
html { background: var(--paper); color: var(--ink); font: 1rem/1.5 Charter, 'Bitstream Charter', Cambria, Georgia, 'Liberation Serif', serif; }
body { max-width: 64rem; margin: 0 auto; padding: 1.5rem 1rem 4rem; font-variant-numeric: lining-nums tabular-nums; }
h1, h2, h3, p, dl, dd, figure, table { margin: 0; }
h1, h2, h3 { font-weight: 600; line-height: 1.25; text-wrap: balance; }
h1 { font-size: 1.6rem; }
h2 { font-size: 1.2rem; }
h3 { font-size: 1.1rem; }
p + p { margin-top: 0.25rem; }
a { color: inherit; text-decoration-line: underline; text-decoration-color: var(--rule); text-underline-offset: 0.18em; }
a:hover { text-decoration-color: currentColor; }
:focus-visible { outline: 2px solid var(--accent); outline-offset: 2px; }
:target { outline: 2px solid var(--accent); outline-offset: -2px; }
code, .place, .code { font-family: ui-monospace, 'Cascadia Mono', Menlo, Consolas, 'Liberation Mono', monospace; font-size: 0.85em; overflow-wrap: anywhere; }
.quiet, .field, caption { color: var(--quiet); font-size: 0.875rem; }
.name { font-weight: 600; }
.unit { font-size: 0.9em; }
sup { line-height: 0; font-size: 0.75em; }

.title-block { display: grid; grid-template-columns: minmax(0, 1fr) minmax(0, 27rem); border: 2px solid var(--ink); }
.title-block .job { padding: 0.6rem 0.9rem 0.9rem; }
.title-block .about { margin-top: 0.4rem; max-width: 34rem; }
.title-block dl { display: grid; grid-template-columns: 1fr 1fr; border-left: 1px solid var(--ink); }
.title-block dl > div { padding: 0.35rem 0.75rem; min-height: 4.25rem; overflow-wrap: anywhere; }
.title-block dl > div:nth-child(even) { border-left: 1px solid var(--ink); }
.title-block dl > div:nth-child(n + 3) { border-top: 1px solid var(--ink); }
.title-block .signed { display: flex; flex-direction: column; justify-content: space-between; }
.title-block .signed dd { border-top: 1px dotted var(--quiet); margin-top: 2.2rem; }
.verdict { padding: 0.9rem 0; font-size: 1.05rem; }

table { border-collapse: collapse; }
caption { text-align: left; padding: 0.25rem 0; }
th { font-weight: 400; text-align: left; }
.facts th, .facts td, .amounts th, .amounts td, .list th, .list td { padding: 0.12rem 0.9rem 0.12rem 0; vertical-align: baseline; }
.facts tr + tr, .amounts tbody tr, .list tr + tr { border-top: 1px solid var(--faint); }
.facts thead th, .amounts thead th { color: var(--quiet); font-size: 0.875rem; }
.facts thead + tbody tr { border-top: 1px solid var(--faint); }
.amounts thead th + th { text-align: right; }
.number { text-align: right; white-space: nowrap; }
.list .number:last-child, .amounts .number:last-child { padding-right: 0; }
.tail { display: inline-block; text-align: left; }
.bad { font-weight: 700; border-bottom: 2px solid currentColor; }
.bad a { text-decoration: none; }
.good { font-weight: 600; color: var(--accent); }
.message { margin-top: 0.3rem; font-size: 0.9rem; }

.grid, .formulas { font-size: 0.85rem; line-height: 1.35; }
.grid th, .grid td, .formulas th, .formulas td { border: 1px solid var(--faint); padding: 0.15rem 0.5rem; vertical-align: baseline; }
.grid thead th, .grid tbody th, .formulas thead th { color: var(--quiet); text-align: center; }
.grid td { max-width: 20rem; }
.formulas { margin-top: 1rem; width: 100%; }
.formulas tbody th { white-space: nowrap; }
.formulas thead th { text-align: left; }
.wide { overflow-x: auto; }
.list { max-width: 100%; }
.list th, .list td:not(.number) { overflow-wrap: break-word; }
.sheet + .sheet { margin-top: 2rem; }
.for-reading-aloud { position: absolute; width: 1px; height: 1px; overflow: hidden; clip-path: inset(50%); white-space: nowrap; }`;
