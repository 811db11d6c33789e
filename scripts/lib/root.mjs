import { mkdirSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The repository's root folder, wherever a script was called from. */
export const root = resolve(dirname(fileURLToPath(import.meta.url)), '../..');

/** Where everything a local run leaves behind lies; git ignores it. */
export const localDir = join(root, '.local');

/** An absolute path below the root. */
export const fromRoot = (...parts) => join(root, ...parts);

/** Makes a folder (and its parents) and returns its path. */
export function ensureDir(path, mode = 0o755) {
  mkdirSync(path, { recursive: true, mode });
  return path;
}
