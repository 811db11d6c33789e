// Draws the demo market's photos.
// Usage: node scripts/demo-photos/render.mjs [name …]     (no name: all of them)
import { mkdir, writeFile } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import { photograph } from './camera.mjs';
import { subjects } from './subjects.mjs';

const folder = new URL('../../apps/api/src/seeds/photos/', import.meta.url);
const maxBytes = 146_000;

const wanted = process.argv.slice(2);
const unknown = wanted.filter((name) => !(name in subjects));
if (unknown.length > 0) {
  console.error(`No such photo: ${unknown.join(', ')}. There are: ${Object.keys(subjects).join(', ')}`);
  process.exit(1);
}

await mkdir(folder, { recursive: true });
for (const name of wanted.length > 0 ? wanted : Object.keys(subjects)) {
  const jpeg = await photograph(subjects[name](), { maxBytes });
  await writeFile(fileURLToPath(new URL(`${name}.jpg`, folder)), jpeg);
  console.log(`${name}.jpg  ${Math.round(jpeg.length / 1000)} kB`);
}
