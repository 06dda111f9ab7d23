import { Router } from 'express';
import { shopChange } from '#shared/contracts/session.ts';
import { readBody } from '../../http/read-input.ts';
import { allow, whoAsks } from '../../http/signed-in.ts';
import type { ShopService } from './shop.service.ts';

/** The shop's settings; reading them is part of the session. */
export function shopRoutes(service: ShopService): Router {
  const router = Router();

  router.patch('/shop', allow('manage-shop'), async (req, res) => {
    res.json(await service.change(whoAsks(req).shopId, readBody(req, shopChange)));
  });

  return router;
}
