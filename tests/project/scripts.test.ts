import { spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { isTaken, takeLock } from '../../scripts/lib/lock.mjs';
import { installedEqualsLocked } from '../../scripts/lib/packages.mjs';
import { startService } from '../../scripts/lib/services.mjs';
import { repositoryRoot } from '../support/repository.ts';

const scripts = readdirSync(join(repositoryRoot, 'scripts')).filter((name) => name.endsWith('.mjs'));
const run = (script: string, ...args: string[]) =>
  spawnSync(process.execPath, [join(repositoryRoot, 'scripts', script), ...args], { encoding: 'utf8' });

let folder: string;
beforeEach(() => (folder = mkdtempSync(join(tmpdir(), 'lydite-scripts-'))));
afterEach(() => rmSync(folder, { recursive: true, force: true }));

describe('every script', () => {
  it.each(scripts)('%s prints its usage', (script) => {
    const { status, stdout } = run(script, '--help');
    expect(status).toBe(0);
    expect(stdout).toMatch(/^usage: (node scripts\/|npm )/m);
  });

  it.each(scripts)('%s refuses an option it does not know, and does nothing', (script) => {
    const { status, stderr } = run(script, '--no-such-option');
    expect(status).toBe(2);
    expect(stderr).toContain('usage:');
  });

  it('named in package.json exists', () => {
    const manifest = readFileSync(join(repositoryRoot, 'package.json'), 'utf8');
    const named = [...manifest.matchAll(/node scripts\/([a-z-]+\.mjs)/g)].map(([, name]) => name);
    expect(named.length).toBeGreaterThan(5);
    for (const name of named) expect(scripts).toContain(name);
  });
});

describe('installed packages', () => {
  const write = (path: string, packages: Record<string, object>) => {
    mkdirSync(join(folder, 'node_modules'), { recursive: true });
    writeFileSync(join(folder, path), JSON.stringify({ packages }));
  };
  const locked = {
    '': { name: 'x' },
    'node_modules/a': { version: '1.0.0' },
    'node_modules/b': { version: '2.0.0', optional: true },
  };

  it('equal the lock when every package that is not optional is there in its version', () => {
    write('package-lock.json', locked);
    write('node_modules/.package-lock.json', { 'node_modules/a': { version: '1.0.0' } });
    expect(installedEqualsLocked(folder)).toBe(true);
  });

  it.each([
    ['another version', { 'node_modules/a': { version: '1.0.1' } }],
    ['a missing package', {}],
  ])('differ from the lock by %s', (_words, installed) => {
    write('package-lock.json', locked);
    write('node_modules/.package-lock.json', installed);
    expect(installedEqualsLocked(folder)).toBe(false);
  });

  it('differ when nothing is installed', () => {
    write('package-lock.json', locked);
    expect(installedEqualsLocked(folder)).toBe(false);
  });
});

describe('a folder of a stack', () => {
  const sleeper = () => {
    const args = ['-e', 'console.log("up"); setInterval(() => {}, 1000)'];
    return startService({ name: 'sleeper', command: process.execPath, args, logFile: join(folder, 'sleeper.log') });
  };
  const lockFile = () => join(folder, 'running.json');

  it('serves one stack at a time', () => {
    const lock = takeLock(folder);
    expect(isTaken(folder)).toBe(true);
    expect(() => takeLock(folder)).toThrow(/already runs/);
    lock.release();
    expect(isTaken(folder)).toBe(false);
  });

  it('is freed of what a killed stack left running', async () => {
    const service = sleeper();
    takeLock(folder).note([service.pid]);
    const kept = JSON.parse(readFileSync(lockFile(), 'utf8')) as { owner: object };
    writeFileSync(lockFile(), JSON.stringify({ ...kept, owner: { ...kept.owner, startedAt: '1' } }));
    takeLock(folder).release();
    expect(await service.exited).toBe('SIGKILL');
  });

  it('leaves alone a process that only inherited the number', async () => {
    const service = sleeper();
    const stranger = { pid: service.pid, startedAt: '1' };
    writeFileSync(lockFile(), JSON.stringify({ owner: stranger, services: [stranger] }));
    takeLock(folder).release();
    expect(() => service.assertRuns()).not.toThrow();
    await service.stop();
  });
});

describe('a service', () => {
  it('that stops by itself is reported with the end of its log', async () => {
    const args = ['-e', 'console.error("no port"); process.exit(4)'];
    const service = startService({ name: 'api', command: process.execPath, args, logFile: join(folder, 'api.log') });
    expect(await service.exited).toBe('exit 4');
    expect(service.report()).toMatch(/^api stopped \(exit 4\)[^]*no port/);
    expect(() => service.assertRuns()).toThrow(/no port/);
  });
});
