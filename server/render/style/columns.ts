/** The ruled columns of the pad: the two upright rules run through every section. */
export const COLUMNS = `main { --reference: 8rem; --output: 15rem; }
.row { display: grid; grid-template-columns: var(--reference) minmax(0, 1fr) var(--output); }
.row > *, .pad > tbody > tr > td { padding: 0.6rem 0.9rem; min-width: 0; }
.row > :nth-child(n + 2), .pad > tbody > tr > td:nth-child(n + 2) { border-left: 1px solid var(--rule); }
.row > :first-child, .pad > tbody > tr > td:first-child { padding-left: 0.25rem; }
.pad { width: 100%; table-layout: fixed; border-collapse: separate; border-spacing: 0; }
.pad .reference { width: var(--reference); }
.pad .output { width: var(--output); }
.pad > tbody > tr > td { vertical-align: top; overflow-wrap: break-word; border-top: 1px solid var(--faint); }
.step { border-top: 1px solid var(--faint); }
.heading { border-top: 2px solid var(--rule); }
.heading > * { padding-block: 1.4rem 0.4rem; }
.heading > p { margin: 0; padding-top: 1.6rem; color: var(--quiet); font-size: 0.875rem; }
#source > .heading { border-bottom: 1px solid var(--rule); margin-bottom: 1rem; }
#source > .heading > * { border: 0; padding-inline: 0; }
#source > .heading > p { display: none; }
#source > .heading { display: block; }
main { border-bottom: 2px solid var(--rule); }
.result { font-size: 1.15rem; }
#answers .result { font-size: 1.35rem; font-weight: 600; }
.comes-from { color: var(--quiet); font-size: 0.9rem; }
.comes-from a { color: var(--ink); }
.equation { margin: 0.9rem 0; font-size: 1.15rem; overflow-x: auto; overflow-y: hidden; padding-block: 0.1rem; }
.equation math { width: auto; text-align: left; }
.evidence { margin-top: 0.8rem; }
.figures { display: flex; flex-wrap: wrap; gap: 0.5rem 2.5rem; margin-top: 0.3rem; align-items: flex-start; }`;
