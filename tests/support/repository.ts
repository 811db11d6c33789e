import { cpSync, mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The repository's root folder. */
export const repositoryRoot = resolve(dirname(fileURLToPath(import.meta.url)), '../..');

/**
 * A temporary folder that is linted as the repository is, with nothing in it but the given files.
 * @param files text by path from the root
 */
export function plantRepository(files: Record<string, string>): { root: string; remove: () => void } {
  const root = mkdtempSync(join(tmpdir(), 'lydite-planted-'));
  cpSync(join(repositoryRoot, '.oxlintrc.json'), join(root, '.oxlintrc.json'));
  symlinkSync(join(repositoryRoot, 'node_modules'), join(root, 'node_modules'));
  for (const [path, text] of Object.entries(files)) {
    mkdirSync(dirname(join(root, path)), { recursive: true });
    writeFileSync(join(root, path), text);
  }
  return { root, remove: () => rmSync(root, { recursive: true, force: true }) };
}
