#!/usr/bin/env node
import { Refusal, runScript } from './lib/main.mjs';
import { isRunning, openCluster, removeCluster, startCluster, stopCluster } from './postgres/cluster.mjs';
import { databaseUrls, dropDatabase, ensureDatabase } from './postgres/database.mjs';

const usage = `The private PostgreSQL of this checkout: loopback, a free port, data in .local.

usage: node scripts/postgres.mjs <action> [--fast] [--database NAME]

  start    make the cluster and the database if missing, start the server, print the connection strings as JSON
  stop     stop the server
  status   print "running" or "stopped" (exit 0 or 1)
  urls     print the connection strings as JSON
  drop     drop the database
  remove   stop the server and delete the cluster

  --fast             the cluster of the tests (.local/postgres-test): quick, and loses data if the machine stops
  --database NAME    default: lydite`;

const actions = {
  async start({ cluster, database }) {
    await startCluster(cluster);
    ensureDatabase({ cluster, database });
    printUrls({ cluster, database });
  },
  stop: ({ cluster }) => stopCluster(cluster),
  status({ cluster }) {
    const running = isRunning(cluster);
    console.log(running ? 'running' : 'stopped');
    process.exitCode = running ? 0 : 1;
  },
  urls: printUrls,
  drop: dropDatabase,
  remove: ({ cluster }) => removeCluster(cluster),
};

function printUrls({ cluster, database }) {
  console.log(JSON.stringify(databaseUrls({ cluster, database }), null, 2));
}

await runScript({
  usage,
  words: true,
  options: { fast: { type: 'boolean', default: false }, database: { type: 'string', default: 'lydite' } },
  async run({ values, positionals: [name] }) {
    const action = Object.hasOwn(actions, name ?? '') ? actions[name] : undefined;
    if (!action) throw new Refusal(usage, { exitCode: 2 });
    await action({ cluster: openCluster({ fast: values.fast }), database: values.database });
  },
});
