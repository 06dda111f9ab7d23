import { Router } from 'express';
import { readingRequest, tracedFramesRequest, tracingChange } from '#shared/contracts/tracings.ts';
import type { FileStore } from '../../files/file-store.ts';
import { pathParameter, readBody } from '../../http/read-input.ts';
import { sendFile, whileAsked } from '../../http/send-file.ts';
import { allow, signedIn, whoAsks } from '../../http/signed-in.ts';
import { takeDrawing, takenDrawing } from '../../http/take-drawing.ts';
import type { TracingsService } from './tracings.service.ts';

/** Uploaded drawings, how they are read, and the frames that come of them. */
export function tracingsRoutes(service: TracingsService, files: FileStore): Router {
  const router = Router();
  const take = takeDrawing(files, 'file');

  router.get('/jobs/:jobId/tracings', signedIn, async (req, res) => {
    res.json(await service.list(whoAsks(req).shopId, pathParameter(req, 'jobId')));
  });

  router.post(
    '/jobs/:jobId/tracings',
    allow('edit-frames'),
    async (req, _res, next) => {
      await service.mustHaveJob(whoAsks(req).shopId, pathParameter(req, 'jobId'));
      next();
    },
    take,
    async (req, res) => {
      const drawing = takenDrawing(req, 'file');
      res.status(201).json(await service.add(whoAsks(req), pathParameter(req, 'jobId'), drawing));
    },
  );

  router.get('/tracings/:tracingId', signedIn, async (req, res) => {
    res.json(await service.read(whoAsks(req).shopId, pathParameter(req, 'tracingId')));
  });

  router.patch('/tracings/:tracingId', allow('edit-frames'), async (req, res) => {
    const { removed } = readBody(req, tracingChange);
    res.json(await service.setRemoved(whoAsks(req).shopId, pathParameter(req, 'tracingId'), removed));
  });

  router.post('/tracings/:tracingId/reading', signedIn, async (req, res) => {
    const { options } = readBody(req, readingRequest);
    const tracingId = pathParameter(req, 'tracingId');
    res.type('json').send(await service.reading(whoAsks(req).shopId, tracingId, options, whileAsked(req, res)));
  });

  router.post('/tracings/:tracingId/frames', allow('edit-frames'), async (req, res) => {
    const wanted = readBody(req, tracedFramesRequest);
    res.status(201).json(await service.addFrames(whoAsks(req), pathParameter(req, 'tracingId'), wanted));
  });

  router.get('/tracings/:tracingId/file', allow('download'), async (req, res) => {
    const file = await service.file(whoAsks(req).shopId, pathParameter(req, 'tracingId'));
    sendFile(res, file, 'application/octet-stream');
  });

  return router;
}
