import react from '@vitejs/plugin-react';
import tailwindcss from '@tailwindcss/vite';
import { defineConfig } from 'vite';

const api = `http://127.0.0.1:${process.env.PORT ?? '4040'}`;

export default defineConfig({
  plugins: [react(), tailwindcss()],
  publicDir: 'src/public',
  build: {
    outDir: 'dist/client',
    emptyOutDir: true,
    target: 'es2022',
    modulePreload: { polyfill: false },
  },
  server: { port: 5173, proxy: { '/api': api, '/dev': api, '/healthz': api } },
});
