import { ImportPlan, ReadingOptions } from '@shared/contracts/imports';
import { type RequestHandler, Router } from 'express';
import type { Context } from '../context';
import { actorOf, personOf } from '../http/actor-of';
import { pathId, pathText } from '../http/route-parameters';
import { findTeam } from '../teams/find-team';
import { findBatch, listBatches } from './find-batch';
import { lastTags } from './last-tags';
import { sha256 } from './original-files';
import { presentBatch } from './present-batch';
import { frameReading, presentReading } from './present-reading';
import { readFile } from './read-sweep-file';
import { sendFrames, wantsFrames } from '../http/send-frames';
import { startBatch } from './start-batch';
import { jsonField, uploadedFile, uploadMany, uploadOne } from '../http/upload';

/** Import by page: readings and batches. */
export function importRoutes(context: Context): Router {
  /** Stops who may not add sweeps before the files are read. */
  const requireAdder: RequestHandler = (request, _response, next) => {
    findTeam(context, actorOf(request), pathText(request, 'team'), 'sweeps.add');
    next();
  };

  return Router()
    .post('/teams/:team/readings', requireAdder, uploadOne(context, 'file'), (request, response) => {
      const { buffer, originalname } = uploadedFile(request, 'file');
      const { timeZone } = findTeam(context, actorOf(request), pathText(request, 'team'), 'sweeps.add');
      const reading = readFile(buffer, ReadingOptions.parse(jsonField(request, 'options', {})));
      if (wantsFrames(request)) {
        sendFrames(response, frameReading(reading));
      } else {
        response.json(presentReading(reading, { fileName: originalname, sha256: sha256(buffer), timeZone }));
      }
    })
    .post('/teams/:team/imports', requireAdder, uploadMany(context, 'files'), (request, response) => {
      const person = personOf(request);
      const team = findTeam(context, person, pathText(request, 'team'), 'sweeps.add');
      const plan = ImportPlan.parse(jsonField(request, 'plan'));
      const files = Array.isArray(request.files) ? request.files : [];
      const staged = files.map(({ originalname, filename }) => ({ fileName: originalname, sha256: filename }));
      const batch = startBatch(context, person, team, plan, staged);
      response.status(202).json(presentBatch(findBatch(context, team, batch.id)));
    })
    .get('/teams/:team/imports', (request, response) => {
      const team = findTeam(context, actorOf(request), pathText(request, 'team'), 'results.read');
      response.json(listBatches(context, team).map(presentBatch));
    })
    .get('/teams/:team/imports/:id', (request, response) => {
      const team = findTeam(context, actorOf(request), pathText(request, 'team'), 'results.read');
      response.json(presentBatch(findBatch(context, team, pathId(request, 'id'))));
    })
    .get('/teams/:team/last-tags', (request, response) => {
      const person = personOf(request);
      response.json(lastTags(context, person, findTeam(context, person, pathText(request, 'team'), 'sweeps.add')));
    });
}
