import { OverlayQuery, SweepQuery, type SweepStored, SweepTags } from '@shared/contracts/sweeps';
import { type RequestHandler, Router } from 'express';
import type { Context } from '../context';
import { actorOf } from '../http/actor-of';
import { pathId, queryOf, queryTeam } from '../http/route-parameters';
import { findProduct } from '../products/find-product';
import { findSweep, sweepById } from './find-sweep';
import { frameSweeps } from './frame-sweeps';
import { importSweep } from './import-sweep';
import { listSweeps } from './list-sweeps';
import { overlay } from './overlay';
import { presentSweep, presentTrace } from './present-sweep';
import { readTrace } from './read-trace';
import { removeSweep } from './remove-sweep';
import { sendFrames, wantsFrames } from '../http/send-frames';
import { jsonField, uploadedFile, uploadOne } from '../http/upload';

/** Sweeps: import, record, trace, original, overlay. */
export function sweepRoutes(context: Context): Router {
  return Router()
    .post('/v1/sweeps', requireActor, uploadOne(context, 'file'), (request, response) => {
      const actor = actorOf(request);
      const tags = SweepTags.parse(jsonField(request, 'tags'));
      const { buffer: bytes, originalname: fileName } = uploadedFile(request, 'file');
      const { duplicate, sweepId } = importSweep(context, actor, { bytes, fileName, tags, team: queryTeam(request) });
      const answer: SweepStored = { duplicate, sweep: presentSweep(sweepById(context, sweepId)) };
      response
        .status(duplicate ? 200 : 201)
        .location(`/api/v1/sweeps/${sweepId}`)
        .json(answer);
    })
    .get('/v1/sweeps', (request, response) => {
      const { rows, nextBefore } = listSweeps(context, actorOf(request), queryOf(request, SweepQuery));
      response.json({ sweeps: rows.map(presentSweep), nextBefore });
    })
    .get('/v1/sweeps/:id', (request, response) => {
      response.json(presentSweep(findSweep(context, actorOf(request), pathId(request, 'id'), 'results.read')));
    })
    .get('/v1/sweeps/:id/trace', (request, response) => {
      const row = findSweep(context, actorOf(request), pathId(request, 'id'), 'results.read');
      if (wantsFrames(request)) {
        sendFrames(response, frameSweeps(context, [row]));
      } else {
        response.json(presentTrace(row, readTrace(context, row.sweep.id)));
      }
    })
    .get('/v1/sweeps/:id/file', (request, response) => {
      const { sweep } = findSweep(context, actorOf(request), pathId(request, 'id'), 'results.read');
      // The type stands after the name, which would set one of its own: a browser must never show the file as a page.
      response.attachment(sweep.fileName).type('application/octet-stream').set('x-content-type-options', 'nosniff');
      response.send(context.originals.read(sweep.originalSha256));
    })
    .delete('/v1/sweeps/:id', (request, response) => {
      const actor = actorOf(request);
      removeSweep(context, actor, findSweep(context, actor, pathId(request, 'id'), 'sweeps.remove'));
      response.status(204).end();
    })
    .get('/v1/overlay', (request, response) => {
      const query = queryOf(request, OverlayQuery);
      const found = findProduct(context, actorOf(request), query.product, query.team, 'results.read');
      sendFrames(response, overlay(context, found, query));
    });
}

/** Stops a stranger before the body is read. */
const requireActor: RequestHandler = (request, _response, next) => {
  actorOf(request);
  next();
};
