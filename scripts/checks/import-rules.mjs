import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative } from 'node:path';

const clients = ['buyer', 'seller', 'desk'];
const layers = ['lib', 'features', 'pages'];
const isTest = (file) => /\.(test|spec)\.tsx?$/.test(file);

/** Each rule sees one relative import as two paths from the root, and answers with the reason it is forbidden. */
const rules = [featureAsksOnlyReadsAndCommands, clientLooksDownwards, workspaceStaysHome, endingIsWritten];

/** A feature of the API may ask another only through its `*.reads.ts` and `*.commands.ts`. */
function featureAsksOnlyReadsAndCommands({ from, to }) {
  const own = featureOf(from, 'apps/api/src/features/');
  const other = featureOf(to, 'apps/api/src/features/');
  if (!own || !other || own === other || isTest(from) || /\.(reads|commands)\.ts$/.test(to)) return undefined;
  return `feature "${own}" may import only *.reads.ts and *.commands.ts of "${other}"`;
}

/** In a client, lib knows no feature, a feature knows no other feature and no page. */
function clientLooksDownwards({ from, to }) {
  const app = clients.find((name) => from.startsWith(`apps/${name}/src/`));
  if (!app || !to.startsWith(`apps/${app}/src/`)) return undefined;
  const [fromLayer, toLayer] = [from, to].map((path) => layers.indexOf(path.split('/')[3]));
  if (fromLayer === -1 || toLayer === -1) return undefined;
  if (toLayer > fromLayer) return `${layers[fromLayer]}/ may not import ${layers[toLayer]}/`;
  const base = `apps/${app}/src/features/`;
  const [own, other] = [featureOf(from, base), featureOf(to, base)];
  return own && other && own !== other ? `feature "${own}" may not import its sibling "${other}"` : undefined;
}

/** A workspace is imported by its name: a path that leaves one's own goes round its `exports`. */
function workspaceStaysHome({ from, to }) {
  const home = from.split('/').slice(0, 2).join('/');
  return to.startsWith(`${home}/`) ? undefined : `a path may not leave ${home}; import a package by its name`;
}

/** Node needs the ending; so does a reader. */
function endingIsWritten({ specifier }) {
  return /\.[a-z0-9]+(\?[a-z]+)?$/.test(specifier) ? undefined : `"${specifier}" has no ending`;
}

/** The folder's name below `base`; a file directly below it is no feature. */
function featureOf(path, base) {
  if (!path.startsWith(base)) return undefined;
  const [name, ...rest] = path.slice(base.length).split('/');
  return rest.length > 0 ? name : undefined;
}

/**
 * Every relative import under apps/<app>/src and packages/<package>/src that a rule forbids.
 * @param {string} root the folder that holds apps/ and packages/
 * @returns {{file: string, line: number, words: string}[]} paths from the root
 */
export function findForbiddenImports(root) {
  return ['apps', 'packages']
    .filter((kind) => existsSync(join(root, kind)))
    .flatMap((kind) => readdirSync(join(root, kind)).map((name) => join(root, kind, name, 'src')))
    .filter((folder) => existsSync(folder))
    .flatMap(sourcesBelow)
    .flatMap((file) => checkFile({ root, file }));
}

function sourcesBelow(folder) {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) return sourcesBelow(path);
    return /\.tsx?$/.test(entry.name) ? [path] : [];
  });
}

const importOf = /(?:\bfrom|^\s*import|\bimport\s*\()\s*(['"])(\.{1,2}\/[^'"]*)\1/gm;

function checkFile({ root, file }) {
  const from = relative(root, file);
  const text = readFileSync(file, 'utf8');
  return [...text.matchAll(importOf)].flatMap((match) => {
    const specifier = match[2];
    const to = relative(root, join(dirname(file), specifier));
    const line = text.slice(0, match.index).split('\n').length;
    return rules
      .map((rule) => rule({ from, to, specifier }))
      .filter((words) => words !== undefined)
      .map((words) => ({ file: from, line, words }));
  });
}
