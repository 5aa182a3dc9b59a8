import { Router } from 'express';
import { listSamples } from '#shared/api/samples.ts';
import type { Database } from '../../database/client.ts';
import { serve } from '../../http/serve.ts';
import { listSampleGowns } from './repository.ts';

export function samplesRouter(database: Database): Router {
  const router = Router();
  serve(router, listSamples, async () => {
    const rows = await listSampleGowns(database);
    return { samples: rows.map(({ position: _, ...sample }) => sample) };
  });
  return router;
}
