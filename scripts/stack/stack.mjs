import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { runCommand } from '../lib/commands.mjs';
import { takeLock } from '../lib/lock.mjs';
import { ensureDir } from '../lib/root.mjs';
import { readOrMakeSecrets, writeSecrets } from '../lib/secrets.mjs';
import { startService, waitForAnswer } from '../lib/services.mjs';
import { ensureWebhooks } from '../lib/webhooks.mjs';
import { isRunning, openCluster, startCluster, stopCluster } from '../postgres/cluster.mjs';
import { databaseUrls } from '../postgres/database.mjs';
import * as environments from './environment.mjs';
import { demoSignIns, openMarket, seedOnce } from './market.mjs';
import { choosePorts } from './ports.mjs';
import { programsOf } from './programs.mjs';

/**
 * A whole Lydite on this machine: PostgreSQL, the stand-ins, the API and its worker, in a folder of its own.
 * Its steps are called in the order they are written here; `stop()` ends what was started, at whatever step that is.
 */
export class Stack {
  services = [];
  #cluster;
  #stopsCluster = false;
  #environment;

  /**
   * @param {object} plan
   * @param {string} plan.dir where it keeps logs, files, the stand-ins' state and secrets
   * @param {string} plan.database name of its database
   * @param {number} plan.web wished port of the web site; the other ports count up from it
   * @param {boolean} [plan.fast] use the cluster of the tests
   * @param {boolean} [plan.watch] run the sources instead of the builds
   * @param {string[]} [plan.clients] dev servers that need a port
   * @param {object} [plan.settings] settings of the API that differ from a demo's
   */
  static async open({ dir, database, web, fast = false, watch = false, clients = [], settings = {} }) {
    const lock = takeLock(ensureDir(dir));
    const ports = await choosePorts({ web, clients });
    const names = ['jwt', 'pepper', 'paymentsKey'];
    const kept = readOrMakeSecrets({ file: join(dir, 'secrets.json'), names });
    // The processor knows a test key by its first letters.
    const secrets = { ...kept, paymentsKey: `sk_test_${kept.paymentsKey.replace(/[^A-Za-z0-9]/g, '')}` };
    return new Stack({ dir, database, fast, watch, settings, lock, ports, secrets });
  }

  constructor(parts) {
    Object.assign(this, parts);
    this.addresses = environments.addressesOf(parts.ports);
    this.programs = programsOf({ watch: parts.watch });
  }

  /** Starts PostgreSQL and opens the database; `fresh` begins anew. */
  async startPostgres({ fresh = false } = {}) {
    this.#cluster = openCluster({ fast: this.fast });
    // The tests' cluster may be in use by others; the other one belongs to whoever holds this folder's lock.
    this.#stopsCluster = !this.fast || !isRunning(this.#cluster);
    await startCluster(this.#cluster);
    openMarket({ ...this.#market(), fresh });
  }

  /** Starts the payment processor, the mail catcher and the prices, and registers the webhooks. */
  async startStandIns() {
    const { dir, ports, secrets } = this;
    for (const name of ['fakes', 'files']) ensureDir(join(dir, name));
    const env = environments.standInEnvironment({ ports, dir });
    const service = this.start({ name: 'stand-ins', ...this.programs.standIns, env });
    for (const port of [ports.payments, ports.mail]) {
      await waitForAnswer({ url: `http://127.0.0.1:${port}/`, services: [service] });
    }
    const webhookSecrets = await ensureWebhooks({
      paymentsUrl: `http://127.0.0.1:${ports.payments}`,
      secretKey: secrets.paymentsKey,
      target: environments.webhookTarget(ports),
      dir,
    });
    const { watch, settings } = this;
    const urls = this.databaseUrls();
    this.#environment = environments.apiEnvironment({ ports, dir, urls, secrets, webhookSecrets, watch, settings });
    // Commands run from another terminal join this stack through the file.
    writeSecrets({ file: join(dir, 'environment.json'), secrets: this.#commandEnvironment() });
  }

  /** Runs one of the API's commands to its end; returns what it printed. */
  command({ name, args = [] }) {
    const { command } = this.programs;
    return runCommand({
      command: process.execPath,
      args: [...command.args, name, ...args],
      cwd: command.cwd,
      env: { ...process.env, ...this.#commandEnvironment() },
      logFile: this.#logFile(name),
      what: `The command "${name}"`,
    });
  }

  /** Seeds the demo market if this database was not seeded before. */
  seed() {
    return seedOnce({ ...this.#market(), runSeed: () => this.command({ name: 'seed' }) });
  }

  /** Starts the API and the worker and waits until the API says it is ready. */
  async startApi() {
    // The seed has told who can sign in; the market shows roles and addresses, never the password.
    const signIns = demoSignIns(this.dir).map(({ role, email }) => ({ role, email }));
    const env = { ...this.#environment, DEMO_SIGN_INS: JSON.stringify(signIns) };
    this.start({ name: 'api', ...this.programs.api, env });
    this.start({ name: 'worker', ...this.programs.worker, env: this.#environment });
    await waitForAnswer({ url: `http://127.0.0.1:${this.ports.api}/readyz`, services: this.services });
  }

  /** Starts one more service beside the stack's own; it is stopped with them. */
  start({ name, command = process.execPath, args, cwd, env }) {
    const logFile = this.#logFile(name);
    const service = startService({ name, command, args, cwd, env: { ...process.env, ...env }, logFile });
    this.services.push(service);
    this.lock.note(this.services.map(({ pid }) => pid));
    return service;
  }

  /** The connection strings of this stack's database. */
  databaseUrls() {
    return databaseUrls({ cluster: this.#cluster, database: this.database });
  }

  /** Ends everything this stack started; the stand-ins outlive those who call them. */
  async stop() {
    const callers = this.services.filter(({ name }) => name !== 'stand-ins');
    await Promise.all(callers.map((service) => service.stop()));
    await Promise.all(this.services.map((service) => service.stop()));
    if (this.#cluster && this.#stopsCluster) stopCluster(this.#cluster);
    rmSync(join(this.dir, 'environment.json'), { force: true });
    this.lock.release();
  }

  #market() {
    return { cluster: this.#cluster, database: this.database, dir: this.dir };
  }

  #commandEnvironment() {
    return { ...this.#environment, DATABASE_OWNER_URL: this.databaseUrls().DATABASE_OWNER_URL };
  }

  #logFile(name) {
    return join(this.dir, 'logs', `${name}.log`);
  }
}
