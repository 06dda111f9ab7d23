import { Router } from 'express';
import { edgePreset } from '#shared/contracts/edge-presets.ts';
import { pathParameter, readBody } from '../../http/read-input.ts';
import { allow, signedIn, whoAsks } from '../../http/signed-in.ts';
import type { EdgePresetsService } from './edge-presets.service.ts';

/** Edges that the shop saved; whoever edits frames saves them. */
export function edgePresetsRoutes(service: EdgePresetsService): Router {
  const router = Router();

  router.get('/edge-presets', signedIn, async (req, res) => {
    res.json(await service.list(whoAsks(req).shopId));
  });

  router.post('/edge-presets', allow('edit-frames'), async (req, res) => {
    res.status(201).json(await service.add(whoAsks(req).shopId, readBody(req, edgePreset)));
  });

  router.delete('/edge-presets/:presetId', allow('edit-frames'), async (req, res) => {
    await service.remove(whoAsks(req).shopId, pathParameter(req, 'presetId'));
    res.status(204).end();
  });

  return router;
}
