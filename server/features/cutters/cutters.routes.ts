import { Router } from 'express';
import { csvQuery, drawerEntry } from '#shared/contracts/cutters.ts';
import { pathParameter, readBody, readQuery } from '../../http/read-input.ts';
import { sendFile } from '../../http/send-file.ts';
import { allow, signedIn, whoAsks } from '../../http/signed-in.ts';
import { takeFiles, takenFiles } from '../../http/take-files.ts';
import type { CuttersService } from './cutters.service.ts';
import { readCuttersFile } from './read-cutters-file.ts';

/** The shop's cutter drawer. */
export function cuttersRoutes(service: CuttersService): Router {
  const router = Router();

  router.get('/cutters', signedIn, async (req, res) => {
    res.json(await service.list(whoAsks(req).shopId));
  });

  router.get('/cutters/csv', signedIn, async (req, res) => {
    const bytes = new TextEncoder().encode(await service.writeCsv(whoAsks(req).shopId));
    sendFile(res, { name: 'cutters.csv', bytes }, 'text/csv; charset=utf-8');
  });

  router.post('/cutters', allow('edit-cutters'), async (req, res) => {
    const [added] = await service.add(whoAsks(req).shopId, [readBody(req, drawerEntry)]);
    res.status(201).json(added);
  });

  router.post('/cutters/csv', allow('edit-cutters'), takeFiles('file'), async (req, res) => {
    const { take } = readQuery(req, csvQuery);
    res.json(await readCuttersFile(service, whoAsks(req).shopId, takenFiles(req), take === 'true'));
  });

  router.put('/cutters/:cutterId', allow('edit-cutters'), async (req, res) => {
    res.json(await service.change(whoAsks(req).shopId, pathParameter(req, 'cutterId'), readBody(req, drawerEntry)));
  });

  router.delete('/cutters/:cutterId', allow('edit-cutters'), async (req, res) => {
    res.json(await service.remove(whoAsks(req).shopId, pathParameter(req, 'cutterId')));
  });

  return router;
}
