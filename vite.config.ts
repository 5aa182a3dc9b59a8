import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig, runnerImport, type Plugin } from 'vite';

const demoFile = 'demo-gown.svg';

/**
 * The engine's drawing for the front page. Imported when it is asked for: a plain import would make the
 * whole engine part of this configuration, and every change to it would restart the server.
 */
async function drawDemoGown(): Promise<string> {
  const { module } = await runnerImport<typeof import('./src/features/landing/demo-gown.ts')>(
    './src/features/landing/demo-gown.ts',
  );
  return module.demoGown();
}

const demoGownFile = (): Plugin => ({
  name: 'demo-gown-file',
  async generateBundle() {
    this.emitFile({ type: 'asset', fileName: demoFile, source: await drawDemoGown() });
  },
  configureServer(server) {
    server.middlewares.use(`/${demoFile}`, (_request, response, next) => {
      drawDemoGown().then((svg) => {
        response.setHeader('Content-Type', 'image/svg+xml');
        response.end(svg);
      }, next);
    });
  },
});

export default defineConfig({
  plugins: [react(), tailwindcss(), demoGownFile()],
  build: {
    outDir: 'dist/client',
    emptyOutDir: true,
    assetsInlineLimit: 0,
    // The drafting table brings paper and the engine at once; the front page stays light (e2e).
    chunkSizeWarningLimit: 800,
  },
});
