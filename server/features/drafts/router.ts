import { Router } from 'express';
import { draftGarment } from '#shared/api/drafts.ts';
import type { Drafter } from '../../drafting/drafter.ts';
import { addressLimit } from '../../http/address-limit.ts';
import { serve } from '../../http/serve.ts';
import { turnOf } from '../../http/turn-of.ts';
import type { Limits } from '../../settings.ts';

export function draftsRouter(limits: Limits, drafter: Drafter): Router {
  const router = Router();
  router.use(draftGarment.path, addressLimit(limits.draftsPerMinute));
  serve(router, draftGarment, async (inputs, { request, response }) => ({
    writtenJson: await drafter.reply(inputs, turnOf(request, response)),
  }));
  return router;
}
