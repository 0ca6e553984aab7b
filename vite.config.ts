import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

const apiPort = process.env.API_PORT ?? '4174';

export default defineConfig({
  plugins: [react(), tailwindcss()],
  server: {
    host: '127.0.0.1',
    port: Number(process.env.PORT ?? 4173),
    strictPort: true,
    proxy: { '^/(api|healthz|readyz)': { target: `http://127.0.0.1:${apiPort}` } },
  },
  build: { outDir: 'dist', target: 'es2022', sourcemap: false },
});
