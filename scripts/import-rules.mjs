#!/usr/bin/env node
import { resolve } from 'node:path';
import { findForbiddenImports } from './checks/import-rules.mjs';
import { Refusal, runScript } from './lib/main.mjs';
import { root } from './lib/root.mjs';

const usage = `Checks the import rules the linter can't express (the table in DEVELOPERS.md names them all).

usage: node scripts/import-rules.mjs [--root FOLDER]`;

await runScript({
  usage,
  options: { root: { type: 'string', default: root } },
  run({ values }) {
    const forbidden = findForbiddenImports(resolve(values.root));
    if (forbidden.length === 0) return;
    throw new Refusal(forbidden.map(({ file, line, words }) => `${file}:${line}: ${words}`).join('\n'));
  },
});
