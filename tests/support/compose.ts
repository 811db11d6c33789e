import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { parse } from 'yaml';
import { repositoryRoot } from './repository.ts';

/** One service of compose.yaml, as far as the tests look at it. */
export interface ComposeService {
  image?: string;
  build?: { context: string; dockerfile: string; target: string };
  command?: string[];
  environment?: Record<string, string | number | null>;
  volumes?: string[];
  ports?: string[];
  profiles?: string[];
  depends_on?: Record<string, { condition: string }>;
  healthcheck?: { test: string[] };
  deploy?: { replicas: number };
}

export interface ComposeFile {
  services: Record<string, ComposeService>;
  volumes: Record<string, unknown>;
}

export const readDocker = (name: string): string => readFileSync(join(repositoryRoot, 'docker', name), 'utf8');

/** compose.yaml with its merge keys resolved. */
export const readCompose = (): ComposeFile => parse(readDocker('compose.yaml'), { merge: true }) as ComposeFile;

/** The variables of example.env; those it leaves empty (secrets) get `filler`. */
export function readExampleEnvironment({ filler }: { filler: string }): Record<string, string> {
  const lines = readDocker('example.env').matchAll(/^([A-Z_]+)=(.*)$/gm);
  return Object.fromEntries([...lines].map(([, name = '', value = '']) => [name, value === '' ? filler : value]));
}

/**
 * A service's environment as the engine would hand it over.
 * @throws Error naming a variable that example.env does not have
 */
export function resolveEnvironment(service: ComposeService, given: Record<string, string>): Record<string, string> {
  const lookUp = (name: string): string => {
    const value = given[name];
    if (value === undefined) throw new Error(`example.env has no ${name}`);
    return value;
  };
  const entries = Object.entries(service.environment ?? {}).map(([name, value]) => {
    if (value === null) return [name, lookUp(name)];
    return [name, String(value).replace(/\$\{([A-Z_]+)[^}]*\}/g, (_match, variable: string) => lookUp(variable))];
  });
  return Object.fromEntries(entries) as Record<string, string>;
}
