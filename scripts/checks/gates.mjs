import { fromRoot } from '../lib/root.mjs';
import { runCheck } from './run-check.mjs';

const bin = (path) => fromRoot('node_modules', path);

const formatCache = ['--cache', '--cache-strategy=content', `--cache-location=${fromRoot('.local/prettier-cache')}`];

/** What must hold of every source file, each passing or failing as a whole. */
const gates = [
  { name: 'Types', args: [bin('typescript/bin/tsc'), '-b', '--noEmit'] },
  { name: 'Lint', args: [bin('oxlint/bin/oxlint'), '--type-aware', '--deny-warnings', '--quiet'] },
  { name: 'Import rules', args: [fromRoot('scripts/import-rules.mjs')] },
  { name: 'Format', args: [bin('prettier/bin/prettier.cjs'), '--check', '.', '--log-level=warn', ...formatCache] },
];

/** Runs all gates, also after one has failed. */
export async function runGates(tally) {
  for (const gate of gates) tally.addGate(gate.name, (await runCheck(gate)).ok);
}
