import { readFileSync } from 'node:fs';
import { gzipSync } from 'node:zlib';
import { expect, test } from '@playwright/test';
import { repositoryRoot } from '../support/repository.ts';

interface Chunk {
  file: string;
  isEntry?: boolean;
  imports?: string[];
  css?: string[];
}

/** Kilobytes after gzip. A chunk that is loaded later may be a page's own or shared: neither may grow unseen. */
const limitsKb = { entry: 140, chunk: 60, css: 15 } as const;

function readBuild(app: string) {
  const dist = `${repositoryRoot}/apps/${app}/dist`;
  const chunks = JSON.parse(readFileSync(`${dist}/.vite/manifest.json`, 'utf8')) as Record<string, Chunk>;
  const sizeKb = (file: string) => gzipSync(readFileSync(`${dist}/${file}`)).length / 1000;
  const entry = Object.keys(chunks).find((key) => chunks[key]?.isEntry);
  const first = new Set<string>();
  const visit = (key: string) => {
    if (first.has(key)) return;
    first.add(key);
    chunks[key]?.imports?.forEach(visit);
  };
  if (entry) visit(entry);
  return { chunks, first, sizeKb };
}

for (const app of ['buyer', 'seller', 'desk']) {
  test(`the ${app} client keeps its budget`, { tag: '@wide' }, () => {
    const { chunks, first, sizeKb } = readBuild(app);
    const sum = (files: Iterable<string>) => [...files].map(sizeKb).reduce((total, size) => total + size, 0);
    const entryFiles = [...first].flatMap((key) => chunks[key]?.file ?? []);
    const later = Object.values(chunks).filter(({ file }) => file.endsWith('.js') && !entryFiles.includes(file));
    const styles = new Set(Object.values(chunks).flatMap(({ css = [] }) => css));
    expect([entryFiles.length, later.length, styles.size].every((count) => count > 0)).toBe(true);
    expect(sum(entryFiles)).toBeLessThanOrEqual(limitsKb.entry);
    expect(later.filter(({ file }) => sizeKb(file) > limitsKb.chunk).map(({ file }) => file)).toEqual([]);
    expect(sum(styles)).toBeLessThanOrEqual(limitsKb.css);
  });
}
