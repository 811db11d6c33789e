import { defineConfig } from 'vite';

/** One build for the API, the worker and the commands; packages from npm stay imports. */
export default defineConfig({
  build: {
    ssr: true,
    target: 'node20',
    outDir: 'dist',
    sourcemap: true,
    minify: false,
    rollupOptions: { input: { main: 'src/main.ts', worker: 'src/worker.ts', command: 'src/command.ts' } },
  },
});
