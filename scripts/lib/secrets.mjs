import { randomBytes } from 'node:crypto';
import { chmodSync, existsSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { ensureDir } from './root.mjs';

/**
 * Random secrets by name, made once and kept in a file only its owner may read (0600).
 * @param {{file: string, names: string[]}} wanted names that are missing in the file are added
 * @returns an object of 32 random bytes each, as base64url
 */
export function readOrMakeSecrets({ file, names }) {
  const kept = existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : {};
  const missing = names.filter((name) => !(name in kept));
  if (missing.length === 0) return kept;
  for (const name of missing) kept[name] = randomBytes(32).toString('base64url');
  writeSecrets({ file, secrets: kept });
  return kept;
}

/** Keeps secrets in a file only its owner may read. */
export function writeSecrets({ file, secrets }) {
  ensureDir(dirname(file));
  writeFileSync(file, `${JSON.stringify(secrets, null, 2)}\n`, { mode: 0o600 });
  chmodSync(file, 0o600);
}
