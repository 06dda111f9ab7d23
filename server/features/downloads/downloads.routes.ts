import { Router } from 'express';
import { downloadQuery } from '#shared/contracts/frames.ts';
import { pathParameter, readQuery } from '../../http/read-input.ts';
import { allow, whoAsks } from '../../http/signed-in.ts';
import type { DownloadsService } from './downloads.service.ts';
import { sendFile, whileAsked } from '../../http/send-file.ts';

/** Layer sets, setup sheets and frame files. */
export function downloadsRoutes(service: DownloadsService): Router {
  const router = Router();

  router.get('/frames/:frameId/revisions/:letter/layer-set.zip', allow('download'), async (req, res) => {
    const { profile } = readQuery(req, downloadQuery);
    const [frameId, letter] = [pathParameter(req, 'frameId'), pathParameter(req, 'letter')];
    sendFile(
      res,
      await service.layerSet(whoAsks(req).shopId, frameId, letter, profile, whileAsked(req, res)),
      'application/zip',
    );
  });

  router.get('/frames/:frameId/revisions/:letter/setup-sheet.pdf', allow('download'), async (req, res) => {
    const { profile } = readQuery(req, downloadQuery);
    const [frameId, letter] = [pathParameter(req, 'frameId'), pathParameter(req, 'letter')];
    sendFile(
      res,
      await service.setupSheet(whoAsks(req).shopId, frameId, letter, profile, whileAsked(req, res)),
      'application/pdf',
      'inline',
    );
  });

  router.get('/frames/:frameId/revisions/:letter/frame-file', allow('download'), async (req, res) => {
    const file = await service.frameFile(
      whoAsks(req).shopId,
      pathParameter(req, 'frameId'),
      pathParameter(req, 'letter'),
    );
    sendFile(res, file, 'application/json');
  });

  router.get('/frames/:frameId/draft/setup-sheet.pdf', allow('download'), async (req, res) => {
    const { profile } = readQuery(req, downloadQuery);
    const file = await service.draftSheet(
      whoAsks(req).shopId,
      pathParameter(req, 'frameId'),
      profile,
      whileAsked(req, res),
    );
    sendFile(res, file, 'application/pdf', 'inline');
  });

  router.get('/frames/:frameId/draft/frame-file', allow('download'), async (req, res) => {
    sendFile(res, await service.draftFrameFile(whoAsks(req).shopId, pathParameter(req, 'frameId')), 'application/json');
  });

  router.get('/jobs/:jobId/layer-sets.zip', allow('download'), async (req, res) => {
    const { profile } = readQuery(req, downloadQuery);
    const file = await service.jobSet(whoAsks(req).shopId, pathParameter(req, 'jobId'), profile, whileAsked(req, res));
    sendFile(res, file, 'application/zip');
  });

  return router;
}
