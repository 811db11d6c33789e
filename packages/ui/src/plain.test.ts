import { expect, it } from 'vitest';

const sources = import.meta.glob<string>('./**/*.{ts,tsx}', { query: '?raw', import: 'default', eager: true });

function importsOf(file: string, seen = new Set<string>()): Set<string> {
  if (seen.has(file)) return seen;
  seen.add(file);
  for (const [, target = ''] of (sources[file] ?? '').matchAll(/from '([^']+)'/g)) {
    if (!target.startsWith('.')) seen.add(target);
    else importsOf(`.${new URL(target, `http://ui${file.slice(1)}`).pathname}`, seen);
  }
  return seen;
}

it('brings no component and no React to a server', () => {
  const all = [...importsOf('./plain.ts')];
  expect(all).toContain('d3-scale');
  expect(all.filter((one) => one.endsWith('.tsx') || one.startsWith('react'))).toEqual([]);
});
