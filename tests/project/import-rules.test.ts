import { spawnSync } from 'node:child_process';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { plantRepository, repositoryRoot } from '../support/repository.ts';

const bring = (specifier: string) => `import { x } from '${specifier}';\nexport const y = x;\n`;

/** One forbidden import of each kind: where it stands and what it reaches for. The linter must refuse every one. */
const refusedByLinter: [path: string, specifier: string][] = [
  ['packages/valuation/src/a.ts', 'node:fs'],
  ['packages/valuation/src/b.ts', '@lydite/contracts'],
  ['packages/valuation/src/c.ts', 'zod'],
  ['packages/contracts/src/a.ts', 'react'],
  ['packages/contracts/src/b.ts', 'typeorm'],
  ['packages/contracts/src/c.ts', '@lydite/valuation'],
  ['packages/ui/src/a.tsx', '@lydite/contracts'],
  ['packages/ui/src/b.tsx', '@lydite/fakes'],
  ['packages/ui/src/c.tsx', '@lydite/valuation'],
  ['packages/ui/src/d.tsx', '@tanstack/react-query'],
  ['packages/client/src/a.tsx', '@lydite/seller'],
  ['packages/client/src/b.tsx', '@lydite/fakes'],
  ['packages/fakes/src/a.ts', '@lydite/api'],
  ['packages/fakes/src/b.ts', '@lydite/contracts'],
  ['apps/buyer/src/a.tsx', '@lydite/seller'],
  ['apps/seller/src/a.tsx', '@lydite/fakes'],
  ['apps/desk/src/a.tsx', 'typeorm'],
  ['apps/api/src/a.ts', '@lydite/fakes'],
  ['apps/api/src/platform/a.ts', '../features/bids/bids.service.ts'],
  ['apps/api/src/features/bids/bids.service.ts', 'express'],
  ['apps/api/src/features/bids/bids.routes.ts', './bids.queries.ts'],
  ['apps/api/src/features/lots/lots.routes.ts', './lots.reads.ts'],
  ['apps/api/src/features/deals/deals.routes.ts', 'typeorm'],
  ['apps/api/src/b.ts', '../../../tests/support/repository.ts'],
  ['packages/client/src/c.ts', '@lydite/ui/src/button/Button.tsx'],
];

/** Imports of the same kinds that are in order. */
const allowedByLinter: [path: string, specifier: string][] = [
  ['packages/valuation/src/m.ts', 'decimal.js'],
  ['packages/valuation/src/n.ts', './quantity/spread.ts'],
  ['packages/valuation/src/n.test.ts', 'fast-check'],
  ['packages/contracts/src/m.ts', 'zod'],
  ['packages/ui/src/m.tsx', 'react'],
  ['packages/client/src/m.tsx', '@lydite/contracts'],
  ['packages/fakes/src/m.ts', 'express'],
  ['apps/buyer/src/m.tsx', '@lydite/client'],
  ['apps/api/src/platform/m.ts', '@lydite/contracts'],
  ['apps/api/src/features/bids/m.routes.ts', 'express'],
  ['apps/api/src/features/bids/m.service.ts', '../lots/lots.reads.ts'],
];

/** Relative imports only the project's own script can judge, each with a word of the refusal. */
const refusedByScript: [path: string, specifier: string, words: string][] = [
  ['apps/api/src/features/bids/place-bid.ts', '../lots/lots.service.ts', 'feature "bids"'],
  ['apps/api/src/features/bids/close-lot.ts', '../lots/lot.entity.ts', 'feature "bids"'],
  ['apps/buyer/src/lib/a.ts', '../features/lots/lots.queries.ts', 'lib/ may not import features/'],
  ['apps/buyer/src/features/lots/a.ts', '../../pages/LotPage.tsx', 'features/ may not import pages/'],
  ['apps/desk/src/features/lots/a.ts', '../deals/deals.queries.ts', 'sibling "deals"'],
  ['packages/client/src/z.ts', '../../ui/src/index.ts', 'may not leave packages/client'],
  ['packages/client/src/y.ts', './session', 'has no ending'],
];

const allowedByScript: [path: string, specifier: string][] = [
  ['apps/api/src/features/bids/m.ts', '../lots/lots.reads.ts'],
  ['apps/api/src/features/bids/n.ts', '../lots/lots.commands.ts'],
  ['apps/api/src/features/bids/o.ts', '../../platform/app-error.ts'],
  ['apps/buyer/src/pages/LotPage.tsx', '../features/lots/lots.queries.ts'],
  ['apps/buyer/src/features/lots/m.ts', '../../lib/router.ts'],
];

type Planted = ReturnType<typeof plantRepository>;

describe('the linter', () => {
  let planted: Planted;
  let refusals: Map<string, string[]>;

  beforeAll(() => {
    planted = plantRepository({
      ...Object.fromEntries([...refusedByLinter, ...allowedByLinter].map(([path, from]) => [path, bring(from)])),
      'packages/ui/src/types.tsx': "import type { Summary } from '@lydite/valuation';\nexport type Shown = Summary;\n",
      'packages/ui/src/fetching.tsx': "export const load = () => fetch('/api/lots');\n",
      'packages/valuation/src/clock.ts': 'export const stamp = () => Date.now();\n',
      'packages/valuation/src/chance.ts': 'export const chance = () => Math.random();\n',
      'apps/api/src/cycle/one.ts': "import { two } from './two.ts';\nexport const one = () => two;\n",
      'apps/api/src/cycle/two.ts': "import { one } from './one.ts';\nexport const two = () => one;\n",
    });
    refusals = lint(planted.root);
  });
  afterAll(() => planted.remove());

  it.each(refusedByLinter)('refuses in %s an import of %s', (path) => {
    expect(refusals.get(path)).toContain('eslint(no-restricted-imports)');
  });

  it.each(allowedByLinter)('allows in %s an import of %s', (path) => {
    expect(refusals.get(path) ?? []).toEqual([]);
  });

  it('lets the looks take only types from the valuation', () => {
    expect(refusals.get('packages/ui/src/types.tsx') ?? []).toEqual([]);
  });

  it('keeps clock and chance out of the valuation, and fetching out of the looks', () => {
    expect(refusals.get('packages/valuation/src/clock.ts')).toContain('eslint(no-restricted-globals)');
    expect(refusals.get('packages/valuation/src/chance.ts')).toContain('eslint(no-restricted-properties)');
    expect(refusals.get('packages/ui/src/fetching.tsx')).toContain('eslint(no-restricted-globals)');
  });

  it('refuses a cycle', () => {
    expect(refusals.get('apps/api/src/cycle/one.ts')).toContain('import(no-cycle)');
  });
});

describe('the script of import rules', () => {
  let planted: Planted;
  let output: string;
  let status: number | null;

  beforeAll(() => {
    planted = plantRepository(
      Object.fromEntries([...refusedByScript, ...allowedByScript].map(([path, from]) => [path, bring(from)])),
    );
    const script = join(repositoryRoot, 'scripts/import-rules.mjs');
    const run = spawnSync(process.execPath, [script, '--root', planted.root], { encoding: 'utf8' });
    ({ status } = run);
    output = run.stderr;
  });
  afterAll(() => planted.remove());

  it.each(refusedByScript)('refuses in %s an import of %s', (path, _specifier, words) => {
    const line = output.split('\n').find((text) => text.startsWith(`${path}:1:`));
    expect(line).toContain(words);
  });

  it.each(allowedByScript)('allows in %s an import of %s', (path) => {
    expect(output).not.toContain(path);
  });

  it('fails the check', () => {
    expect(status).toBe(1);
  });
});

/** Rules that were broken, by file. */
function lint(root: string): Map<string, string[]> {
  const oxlint = join(repositoryRoot, 'node_modules/oxlint/bin/oxlint');
  const run = spawnSync(process.execPath, [oxlint, '-f', 'json'], { cwd: root, encoding: 'utf8' });
  const { diagnostics } = JSON.parse(run.stdout) as { diagnostics: { code: string; filename: string }[] };
  const refusals = new Map<string, string[]>();
  for (const { code, filename } of diagnostics) refusals.set(filename, [...(refusals.get(filename) ?? []), code]);
  return refusals;
}
