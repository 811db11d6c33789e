import { existsSync, readFileSync, rmSync } from 'node:fs';
import { installDebianPackages } from '../lib/apt.mjs';
import { ensureBuilds } from '../lib/build.mjs';
import { fromRoot } from '../lib/root.mjs';
import { createSteps } from '../lib/steps.mjs';
import { Stack } from '../stack/stack.mjs';
import { runCheck } from './run-check.mjs';

const dir = fromRoot('.local/e2e');
const reportFile = fromRoot('.local/e2e/report.json');
const browsers = [process.env.CHROMIUM_PATH, '/usr/bin/chromium-headless-shell', '/usr/bin/chromium'];

const findBrowser = () => browsers.find((path) => path && existsSync(path));

/** The path of a Chromium; Debian's small one is installed through apt, as root, when there is none. */
export function ensureBrowser() {
  if (!findBrowser()) installDebianPackages({ packages: ['chromium-headless-shell'], what: 'Chromium' });
  return findBrowser();
}

/** Builds, starts a freshly seeded stack on ports of its own, and runs the journeys in the browser against it. */
export async function runBrowserTests({ tally, long }) {
  const name = 'Browser tests';
  const step = createSteps({ total: 7 });
  console.log(`\nA stack for the ${name.toLowerCase()}`);
  let stack;
  try {
    const env = { CHROMIUM_PATH: await step('Browser', ensureBrowser) };
    await step('Builds', () => ensureBuilds({ logDir: `${dir}/logs` }));
    stack = await Stack.open({ dir, database: 'lydite_e2e', web: 4600, fast: true, settings: { LIMITS: 'off' } });
    await step('PostgreSQL', () => stack.startPostgres({ fresh: true }));
    await step('Stand-ins', () => stack.startStandIns());
    await step('Migrations', () => stack.command({ name: 'migrate' }).then(() => 'done'));
    await step('Demo market', () => stack.seed());
    await step('API and worker', () => stack.startApi());
    rmSync(reportFile, { force: true });
    const args = [fromRoot('node_modules/@playwright/test/cli.js'), 'test'];
    await runCheck({ name, args, env: { ...env, ...addressesFor({ stack, long }) }, live: true });
    for (const service of stack.services) service.assertRuns();
    tally.add(name, readReport());
  } catch (error) {
    console.error(error.message);
    tally.add(name, { passed: 0, failed: 1 });
  } finally {
    await stack?.stop();
  }
}

const addressesFor = ({ stack, long }) => ({
  E2E_BASE_URL: stack.addresses.web,
  E2E_MAIL_URL: stack.addresses.mail,
  E2E_PAYMENTS_URL: stack.addresses.payments,
  E2E_DATABASE_URL: stack.databaseUrls().DATABASE_OWNER_URL,
  E2E_SIGN_INS_FILE: `${dir}/sign-ins.json`,
  E2E_REPORT_FILE: reportFile,
  LYDITE_LONG: long ? '1' : '',
});

/** Flaky tests count as failed; so do skipped ones, and an error outside the tests. */
function readReport() {
  if (!existsSync(reportFile)) return { passed: 0, failed: 1 };
  const { stats, errors } = JSON.parse(readFileSync(reportFile, 'utf8'));
  return { passed: stats.expected, failed: stats.unexpected + stats.flaky + stats.skipped + errors.length };
}
