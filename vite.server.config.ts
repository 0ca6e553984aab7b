import { defineConfig } from 'vite';

/** The three programs that run on the server: it serves, it migrates, it loads the demo. */
export default defineConfig({
  publicDir: false,
  ssr: { external: true }, // every package stays in node_modules; the native ones cannot be bundled
  build: {
    ssr: true,
    outDir: 'dist-server',
    target: 'node20',
    sourcemap: true,
    rolldownOptions: {
      output: { chunkFileNames: '[name]-[hash].js' },
      input: { main: 'server/main.ts', migrate: 'server/migrate.ts', demo: 'server/demo.ts' },
    },
  },
});
