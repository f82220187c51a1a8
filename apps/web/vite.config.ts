import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defaultClientConditions, defineConfig } from 'vite';
import { slimContract } from './build/slim-operations.ts';

/** The API that `npm run dev` serves. */
const API = `http://127.0.0.1:${process.env['TIPWARD_PORT'] ?? '4310'}`;

export default defineConfig({
  plugins: [slimContract(), react(), tailwindcss()],
  resolve: { conditions: ['@tipward/source', ...defaultClientConditions] },
  server: { host: '127.0.0.1', proxy: { '/api': { target: API } } },
  preview: { host: '127.0.0.1', proxy: { '/api': { target: API } } },
  worker: { format: 'es' },
  build: {
    target: 'es2023',
    // Fonts and images stay files: the content security policy has no data: for fonts.
    assetsInlineLimit: 0,
    modulePreload: { polyfill: false },
  },
});
