import { Router } from 'express';
import { draftGownRequest } from '#shared/api/drafts.ts';
import { addressLimit } from '../../http/address-limit.ts';
import { draftOrRefuse } from '../../http/draft-or-refuse.ts';
import { serve } from '../../http/serve.ts';
import type { Limits } from '../../settings.ts';

export function draftsRouter(limits: Limits): Router {
  const router = Router();
  router.use(draftGownRequest.path, addressLimit(limits.draftsPerMinute));
  serve(router, draftGownRequest, (inputs) => Promise.resolve(draftOrRefuse(inputs, 'cm')));
  return router;
}
