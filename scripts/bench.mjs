#!/usr/bin/env node
import { spawnSync } from 'node:child_process';
import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { tsImport } from 'tsx/esm/api';
import { installDebianPackages } from './lib/apt.mjs';
import { nameOf } from './lib/commands.mjs';
import { Refusal, runScript } from './lib/main.mjs';
import { ensureDir, localDir } from './lib/root.mjs';

const usage = `Times the estimate of a six-line lot with 10 000 draws and all its outputs, in turns with the same model in NumPy and
in a plain loop; prints a table, writes it as JSON under .local/bench, and fails when the estimate takes more than half of
NumPy's time. NumPy is Debian's python3-numpy, installed when run as root, and left out with a message otherwise.

usage: npm run bench [-- --python PATH]

  --python PATH   another Python with NumPy, instead of /usr/bin/python3`;

/** Most of NumPy's time that the estimate may take. */
const mostShare = 0.5;

await runScript({
  usage,
  options: { python: { type: 'string', default: '/usr/bin/python3' } },
  async run({ values }) {
    const { benchEstimate } = await tsImport('../tests/bench/estimate-bench.ts', import.meta.url);
    const rows = await benchEstimate(findNumpy(values.python));
    const file = join(ensureDir(join(localDir, 'bench')), 'estimate.json');
    writeFileSync(file, `${JSON.stringify(rows, null, 2)}\n`);
    printTable(rows);
    console.log(`\nWritten to ${nameOf(file)}`);
    judge(rows);
  },
});

/** The Python to time against, or null, with the reason said, when there is no NumPy to be had. */
function findNumpy(python) {
  const has = () => spawnSync(python, ['-c', 'import numpy'], { stdio: 'ignore' }).status === 0;
  if (has()) return python;
  try {
    installDebianPackages({ packages: ['python3-numpy'], what: 'NumPy' });
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    console.log(`NumPy is left out. ${error.message}\n`);
  }
  return has() ? python : null;
}

function printTable(rows) {
  const [{ medianMs: ownMs }] = rows;
  console.log('Six lines, 10 000 draws, all outputs, one core\n');
  console.log(`${'estimate by'.padEnd(26)}${['median', 'best', 'times Lydite', 'p50'].map(right).join('')}`);
  for (const { name, medianMs, bestMs, middleG } of rows) {
    const figures = [`${medianMs.toFixed(1)} ms`, `${bestMs.toFixed(1)} ms`, (medianMs / ownMs).toFixed(1)];
    console.log(`${name.padEnd(26)}${[...figures, `${middleG.toFixed(2)} g`].map(right).join('')}`);
  }
}

function right(text) {
  return text.padStart(14);
}

function judge([own, ...rivals]) {
  const numpy = rivals.find(({ name }) => name.startsWith('NumPy'));
  if (!numpy) return;
  const share = own.medianMs / numpy.medianMs;
  const words = `The estimate takes ${share.toFixed(2)} of NumPy's time; at most ${mostShare} is wanted.`;
  if (share > mostShare) throw new Refusal(words);
  console.log(words);
}
