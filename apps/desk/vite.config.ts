import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

/** No inlined assets: the content security policy allows no data: addresses. */
export default defineConfig({
  base: '/desk/',
  plugins: [react(), tailwindcss()],
  build: { assetsInlineLimit: 0, manifest: true, target: 'es2023' },
});
