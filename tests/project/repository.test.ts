import { execFileSync } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { basename, join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { repositoryRoot } from '../support/repository.ts';

const files = execFileSync('git', ['ls-files', '--cached', '--others', '--exclude-standard'], {
  cwd: repositoryRoot,
  encoding: 'utf8',
})
  .trim()
  .split('\n')
  .filter((path) => existsSync(join(repositoryRoot, path)));

const read = (path: string) => readFileSync(join(repositoryRoot, path), 'utf8');
const sources = files.filter((path) => /\.(ts|tsx|mjs)$/.test(path));
const texts = files.filter((path) => /\.(ts|tsx|mjs|css|html|json|md|yaml|sql|env)$|Dockerfile$|Caddyfile$/.test(path));
const workspaceSources = sources.filter((path) => /^(apps|packages)\/[a-z]+\/src\//.test(path));

describe('the repository', () => {
  it('names files in kebab-case, components in PascalCase, with a role after a dot', () => {
    const kebab = /^[a-z0-9]+(-[a-z0-9]+)*(\.[a-z0-9]+(-[a-z0-9]+)*)*\.(ts|mjs)$/;
    const component = /^([A-Z][A-Za-z0-9]*|[a-z0-9]+(-[a-z0-9]+)*)(\.[a-z0-9-]+)*\.tsx$/;
    const odd = sources.filter((path) => !kebab.test(basename(path)) && !component.test(basename(path)));
    expect(odd).toEqual([]);
  });

  it('has no folder for things without a home', () => {
    expect(sources.filter((path) => /(^|\/)(utils?|helpers?|misc|common)\//.test(path))).toEqual([]);
  });

  it('declares no enum', () => {
    const declares = (path: string) => /^\s*(export\s+)?(const\s+)?enum\s+\w/m.test(read(path));
    expect(workspaceSources.filter(declares)).toEqual([]);
  });

  it('locks packages without the address of a registry', () => {
    expect(read('package-lock.json')).not.toMatch(/"resolved": "https?:/);
  });

  it('pins every package to one version', () => {
    const loose = files
      .filter((path) => basename(path) === 'package.json')
      .flatMap((path) => {
        const { dependencies = {}, devDependencies = {} } = JSON.parse(read(path)) as Record<
          string,
          Record<string, string>
        >;
        return Object.entries({ ...dependencies, ...devDependencies }).map(
          ([name, version]) => `${path}: ${name} ${version}`,
        );
      })
      .filter((line) => !/ \d+\.\d+\.\d+$/.test(line));
    expect(loose).toEqual([]);
  });

  it('uses no word it must not, and names no folder of the machine it was written on', () => {
    const unwanted = new RegExp(['\\bescr', 'ow\\b|(?<![\\w.])/(work|root|home)/\\w'].join(''), 'i');
    expect(texts.filter((path) => path !== 'package-lock.json' && unwanted.test(read(path)))).toEqual([]);
  });

  it('keeps no secret in its files', () => {
    const secret = /\b[sr]k_live_\w{8,}|\bwhsec_[A-Za-z0-9]{24,}|-----BEGIN [A-Z ]+KEY-----\n/;
    expect(texts.filter((path) => secret.test(read(path)))).toEqual([]);
  });
});
