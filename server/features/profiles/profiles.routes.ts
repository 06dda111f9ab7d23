import { Router } from 'express';
import { fileProfile } from '#shared/contracts/profiles.ts';
import { pathParameter, readBody } from '../../http/read-input.ts';
import { allow, signedIn, whoAsks } from '../../http/signed-in.ts';
import type { ProfilesService } from './profiles.service.ts';

/** How the shop wants its DXFs. */
export function profilesRoutes(service: ProfilesService): Router {
  const router = Router();

  router.get('/profiles', signedIn, async (req, res) => {
    res.json(await service.list(whoAsks(req).shopId));
  });

  router.post('/profiles', allow('edit-profiles'), async (req, res) => {
    res.status(201).json(await service.add(whoAsks(req).shopId, readBody(req, fileProfile)));
  });

  router.put('/profiles/:profileId', allow('edit-profiles'), async (req, res) => {
    res.json(await service.change(whoAsks(req).shopId, pathParameter(req, 'profileId'), readBody(req, fileProfile)));
  });

  router.delete('/profiles/:profileId', allow('edit-profiles'), async (req, res) => {
    await service.remove(whoAsks(req).shopId, pathParameter(req, 'profileId'));
    res.status(204).end();
  });

  return router;
}
