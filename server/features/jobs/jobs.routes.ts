import { Router } from 'express';
import { jobChange, jobRequest, listQuery } from '#shared/contracts/jobs.ts';
import { pathParameter, readBody, readQuery } from '../../http/read-input.ts';
import { allow, signedIn, whoAsks } from '../../http/signed-in.ts';
import type { JobsService } from './jobs.service.ts';

/** Jobs and the tables of their frames. */
export function jobsRoutes(service: JobsService): Router {
  const router = Router();

  router.get('/jobs', signedIn, async (req, res) => {
    const { removed } = readQuery(req, listQuery);
    res.json(await service.list(whoAsks(req).shopId, removed));
  });

  router.post('/jobs', allow('edit-frames'), async (req, res) => {
    res.status(201).json(await service.add(whoAsks(req).shopId, readBody(req, jobRequest).name));
  });

  router.get('/jobs/:jobId', signedIn, async (req, res) => {
    const { removed } = readQuery(req, listQuery);
    res.json(await service.page(whoAsks(req).shopId, pathParameter(req, 'jobId'), removed));
  });

  router.patch('/jobs/:jobId', allow('edit-frames'), async (req, res) => {
    res.json(await service.change(whoAsks(req).shopId, pathParameter(req, 'jobId'), readBody(req, jobChange)));
  });

  return router;
}
