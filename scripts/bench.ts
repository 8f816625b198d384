/**
 * `npm run bench [-- --json]`: prints the rows of every module of scripts/bench, which run one after
 * another.
 */
import type { Row } from './benchRow.ts';
import { modulesIn } from './modulesIn.ts';
import { root } from './root.mjs';

interface Benchmark {
  readonly rows: () => Row[] | Promise<Row[]>;
}

const rows: Row[] = [];
for (const benchmark of await modulesIn<Benchmark>(`${root}/scripts/bench`, 'rows')) {
  rows.push(...(await benchmark.rows()));
}

if (process.argv.includes('--json')) {
  console.log(JSON.stringify(rows, null, 2));
} else {
  console.table(
    rows.map((row) => ({ ...row, value: Number(row.value.toPrecision(3)), met: row.met ? 'yes' : 'NO' })),
  );
}
