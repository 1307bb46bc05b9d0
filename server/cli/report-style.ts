/** The look of the reviewer's page: on screen in light and dark, and on paper. */
export const reportStyle = `
:root {
  color-scheme: light dark;
  --paper: #fdfdfb; --card: #ffffff; --ink: #1d2125; --soft: #5c656d; --rule: #d9dcdf;
  --error: #a4202a; --warning: #8a5a00; --information: #1f5a94; --fine: #2b6b45;
  --mark: #fff0b8;
}
@media (prefers-color-scheme: dark) {
  :root {
    --paper: #16191c; --card: #1d2125; --ink: #dfe3e6; --soft: #98a2aa; --rule: #343b41;
    --error: #ff8f8f; --warning: #e8b54a; --information: #86bdf2; --fine: #7cc79a;
    --mark: #4f4312;
  }
}
* { box-sizing: border-box; }
body { margin: 0 auto; padding: 2.5rem 1.5rem 4rem; max-width: 66rem; background: var(--paper); color: var(--ink);
  font: 15px/1.5 system-ui, -apple-system, "Segoe UI", "Helvetica Neue", sans-serif; }
h1 { font-size: 1.7rem; line-height: 1.2; margin: 0 0 .25rem; }
h2 { font-size: 1.15rem; margin: 2.5rem 0 .75rem; padding-bottom: .3rem; border-bottom: 2px solid var(--ink);
  overflow-wrap: anywhere; }
h3 { font-size: 1.02rem; margin: 0; overflow-wrap: anywhere; }
a { color: inherit; }
.soft { color: var(--soft); }
.counts { display: flex; flex-wrap: wrap; gap: .5rem 1.75rem; margin: 1.25rem 0; padding: 0; list-style: none; }
.counts b { font-size: 1.4rem; font-weight: 600; margin-right: .35rem; font-variant-numeric: tabular-nums; }
.error { color: var(--error); } .warning { color: var(--warning); } .information { color: var(--information); }
.fine { color: var(--fine); }
table { border-collapse: collapse; font-variant-numeric: tabular-nums; }
.files { width: 100%; }
.files th { text-align: left; font-weight: 600; color: var(--soft); font-size: .85rem; }
.files th, .files td { padding: .3rem .75rem .3rem 0; border-bottom: 1px solid var(--rule); }
.files .number { text-align: right; width: 7rem; }
article { background: var(--card); border: 1px solid var(--rule); border-radius: 6px; padding: 1rem 1.25rem;
  margin: 1rem 0; break-inside: avoid; }
.head { display: flex; flex-wrap: wrap; gap: .25rem .75rem; align-items: baseline; margin-bottom: .5rem; }
.label { font-weight: 700; border: 1.5px solid currentColor; border-radius: 4px; padding: 0 .4rem; }
.formula { color: var(--soft); }
.line { margin-left: auto; color: var(--soft); font-size: .85rem; }
.body { display: flex; flex-wrap: wrap; gap: 1rem 2rem; align-items: flex-start; }
@media (min-width: 46rem) { .body { flex-wrap: nowrap; } .structures { flex: none; max-width: 45%; } .facts { flex: 1; } }
.structures { display: flex; flex-wrap: wrap; gap: 1rem; }
figure { margin: 0; text-align: center; max-width: 20rem; }
figure svg { max-width: 100%; height: auto; display: block; margin: 0 auto; }
figcaption { font-size: .85rem; color: var(--soft); overflow-wrap: anywhere; }
.facts { min-width: 0; display: flex; flex-direction: column; align-items: flex-start; gap: .6rem; }
.facts caption { text-align: left; font-size: .8rem; font-weight: 600; color: var(--soft); padding-bottom: .1rem; }
.facts th, .facts td { padding: .1rem 1.25rem .1rem 0; vertical-align: top; text-align: left; }
.facts td { overflow-wrap: anywhere; }
.facts th { color: var(--soft); font-weight: 400; white-space: nowrap; }
.facts ul { margin: 0; padding-left: 1.1rem; }
.remark { margin: .6rem 0 0; }
.findings { list-style: none; margin: .9rem 0 0; padding: 0; }
.findings li { border-left: 3px solid currentColor; padding: .15rem 0 .15rem .75rem; margin: .6rem 0; break-inside: avoid; }
.findings p { margin: 0; color: var(--ink); }
.findings .what { font-size: .85rem; font-weight: 600; }
.findings code { display: block; color: var(--soft); white-space: pre-wrap; overflow-wrap: anywhere;
  font: .85rem/1.45 ui-monospace, "SFMono-Regular", Consolas, "Liberation Mono", monospace; }
mark { background: var(--mark); color: var(--ink); border-radius: 2px; }
.accepted { font-size: .9rem; color: var(--soft); margin: .6rem 0 0; }
.signature { display: flex; flex-wrap: wrap; gap: 2.5rem; margin-top: 3.5rem; break-inside: avoid; }
.signature div { flex: 1 1 14rem; border-top: 1px solid var(--ink); padding-top: .25rem; font-size: .85rem;
  color: var(--soft); }
footer { margin-top: 2.5rem; font-size: .85rem; color: var(--soft); }
@media print {
  :root { color-scheme: light; --paper: #fff; --card: #fff; --ink: #000; --soft: #444; --rule: #aaa;
    --error: #8c0f19; --warning: #6b4600; --information: #123f6d; --fine: #14502e; --mark: #eee; }
  body { padding: 0; max-width: none; font-size: 10.5pt; }
  h2 { break-after: avoid; }
}
`;
