import { fromRoot } from '../lib/root.mjs';
import { runCheck } from './run-check.mjs';

const closingLine = /^(\d+) passed, (\d+) failed(?:, (\d+) skipped)?$/gm;

/**
 * Runs Vitest over some of its projects and counts single tests. Skipped tests count as failed: nothing may be left
 * out in silence; so does a run that ends badly with every test passed (an error outside the tests).
 * @param {{name: string, projects: string[], tally: import('./tally.mjs').Tally, live?: boolean, env?: object}} part
 */
export async function runVitest({ name, projects, tally, live = false, env }) {
  const filters = projects.map((project) => `--project=${project}`);
  const { ok, output } = await runCheck({
    name,
    args: [fromRoot('node_modules/vitest/vitest.mjs'), 'run', ...filters],
    env: { NO_COLOR: '1', ...env },
    live,
  });
  const [, passed, failed, skipped = 0] = [...output.matchAll(closingLine)].at(-1) ?? [];
  if (passed === undefined) return tally.add(name, { passed: 0, failed: 1 });
  const bad = Number(failed) + Number(skipped);
  return tally.add(name, { passed: Number(passed), failed: bad === 0 && !ok ? 1 : bad });
}
