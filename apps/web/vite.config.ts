import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

const apiUrl = process.env.API_URL ?? 'http://127.0.0.1:3000';

export default defineConfig({
  plugins: [react()],
  resolve: { conditions: ['thudline-source', 'module', 'browser', 'development|production'] },
  server: {
    host: '127.0.0.1',
    port: Number(process.env.PORT ?? 5173),
    strictPort: true,
    proxy: { '/api': { target: apiUrl } },
  },
  build: { target: 'es2022', sourcemap: false, manifest: true },
});
