import { createServer } from 'vite';
import { runServer } from './run.ts';

const vite = await createServer({ server: { middlewareMode: true }, appType: 'spa' });

await runServer({
  handler: vite.middlewares,
  strictHeaders: false,
  close: () => vite.close(),
});
