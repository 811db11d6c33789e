import { defineConfig } from 'vite';

/** One file with the workspace's own sources; installed packages stay imports. */
export default defineConfig({
  build: { ssr: 'src/start.ts', target: 'node20', outDir: 'dist', sourcemap: true, minify: false },
});
