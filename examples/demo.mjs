// `npm run demo`: from a fresh clone to a checked notebook and the reviewer's page, with one command.
import { relative } from 'node:path';
import { prepare, root, run } from '../.ci/prepare.mjs';

console.log('The demo takes about half a minute the first time, then a few seconds.');
prepare();

const notebook = 'examples/linden-row';
const report = `${notebook}/report.html`;
console.log(`\n> isonym check ${notebook}\n`);
const found = run(process.execPath, ['dist/isonym.js', 'check', notebook]);
// 1 is what the example is for: its mistakes were found.
if (found > 1) process.exit(found);

console.log(`\n> isonym report ${notebook} -o ${report}\n`);
const written = run(process.execPath, ['dist/isonym.js', 'report', notebook, '-o', report]);
if (written > 1) process.exit(written);
console.log(
  `\nOpen ${relative(process.cwd(), `${root}${report}`)} in a browser: it is the page a reviewer gets.`,
);
