import { Router } from 'express';
import { frameTableRequest, type FrameTableAdded } from '#shared/contracts/frame-table.ts';
import { draftRequest, frameChange, frameRequest, releaseRequest } from '#shared/contracts/frames.ts';
import { pathParameter, readBody } from '../../http/read-input.ts';
import { sendFile } from '../../http/send-file.ts';
import { allow, signedIn, whoAsks } from '../../http/signed-in.ts';
import { takeFiles, takenFiles } from '../../http/take-files.ts';
import type { FramesService } from './frames.service.ts';
import type { ReleaseService } from './release.service.ts';
import { takeFrameFiles } from './take-frame-files.ts';
import { writeJobTable } from './write-job-table.ts';

/** Frames, drafts and revisions. */
export function framesRoutes(frames: FramesService, releases: ReleaseService): Router {
  const router = Router();

  router.post('/jobs/:jobId/frames', allow('edit-frames'), async (req, res) => {
    const { particulars } = readBody(req, frameRequest);
    res.status(201).json(await frames.add(whoAsks(req), pathParameter(req, 'jobId'), particulars));
  });

  router.post('/jobs/:jobId/frame-files', allow('edit-frames'), takeFiles('files'), async (req, res) => {
    res.json(await takeFrameFiles(frames, whoAsks(req), pathParameter(req, 'jobId'), takenFiles(req)));
  });

  router.post('/jobs/:jobId/frame-table', allow('edit-frames'), async (req, res) => {
    const { frames: all } = readBody(req, frameTableRequest);
    const added: FrameTableAdded = { frames: await frames.addAll(whoAsks(req), pathParameter(req, 'jobId'), all) };
    res.status(201).json(added);
  });

  router.get('/jobs/:jobId/frames.csv', allow('download'), async (req, res) => {
    const file = await writeJobTable(frames, whoAsks(req).shopId, pathParameter(req, 'jobId'));
    sendFile(res, file, 'text/csv; charset=utf-8');
  });

  router.get('/frames/:frameId', signedIn, async (req, res) => {
    res.json(await frames.read(whoAsks(req).shopId, pathParameter(req, 'frameId')));
  });

  router.patch('/frames/:frameId', allow('edit-frames'), async (req, res) => {
    const { removed } = readBody(req, frameChange);
    res.json(await frames.setRemoved(whoAsks(req).shopId, pathParameter(req, 'frameId'), removed));
  });

  router.put('/frames/:frameId/draft', allow('edit-frames'), async (req, res) => {
    const { version, particulars } = readBody(req, draftRequest);
    res.json(await frames.saveDraft(whoAsks(req), pathParameter(req, 'frameId'), version, particulars));
  });

  router.post('/frames/:frameId/revisions', allow('release'), async (req, res) => {
    res
      .status(201)
      .json(await releases.release(whoAsks(req), pathParameter(req, 'frameId'), readBody(req, releaseRequest)));
  });

  router.get('/frames/:frameId/revisions/:letter', signedIn, async (req, res) => {
    res.json(
      await frames.readRevision(whoAsks(req).shopId, pathParameter(req, 'frameId'), pathParameter(req, 'letter')),
    );
  });

  return router;
}
