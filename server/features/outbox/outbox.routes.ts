import { Router } from 'express';
import { pathParameter } from '../../http/read-input.ts';
import { allow, whoAsks } from '../../http/signed-in.ts';
import type { OutboxService } from './outbox.service.ts';

/** What the product mailed, for the owner to read. */
export function outboxRoutes(service: OutboxService): Router {
  const router = Router();

  router.get('/outbox', allow('manage-people'), async (req, res) => {
    res.json(await service.list(whoAsks(req).shopId));
  });

  router.get('/outbox/:mailId', allow('manage-people'), async (req, res) => {
    res.json(await service.open(whoAsks(req).shopId, pathParameter(req, 'mailId')));
  });

  return router;
}
