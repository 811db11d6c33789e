import { fileURLToPath } from 'node:url';
import { build } from 'vite';

const entry = fileURLToPath(new URL('compute.ts', import.meta.url));

/** The computation as one script that a browser runs, with its functions under the global name `engines`. */
export async function bundleForBrowser(): Promise<string> {
  const built = await build({
    configFile: false,
    logLevel: 'silent',
    build: { write: false, minify: true, lib: { entry, name: 'engines', formats: ['iife'], fileName: 'engines' } },
  });
  const [output] = [built].flat();
  if (!output || !('output' in output)) throw new Error('the bundle has no output');
  return output.output[0].code;
}
