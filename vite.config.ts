import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig, type Plugin } from 'vite';

import { demoGown } from './src/features/landing/demo-gown.ts';

const demoFile = 'demo-gown.svg';

/** The front page's drawing is drawn by the engine itself, at build time and while developing. */
const drawDemoGown = (): Plugin => ({
  name: 'draw-demo-gown',
  generateBundle() {
    this.emitFile({ type: 'asset', fileName: demoFile, source: demoGown() });
  },
  configureServer(server) {
    server.middlewares.use(`/${demoFile}`, (_request, response) => {
      response.setHeader('Content-Type', 'image/svg+xml');
      response.end(demoGown());
    });
  },
});

export default defineConfig({
  plugins: [react(), tailwindcss(), drawDemoGown()],
  build: {
    outDir: 'dist/client',
    emptyOutDir: true,
    assetsInlineLimit: 0,
    // The drafting table brings paper and the engine at once; the front page stays light (e2e).
    chunkSizeWarningLimit: 800,
  },
});
