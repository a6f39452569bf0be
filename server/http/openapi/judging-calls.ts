import { JobRunView } from '@shared/contracts/job-runs';
import { BuildQuery, EvaluateQuery, GateQuery, GateView, VerdictsView } from '@shared/contracts/judging';
import * as z from 'zod';
import { type ApiCall, json, TeamQuery } from './api-call';

const tag = 'Judgement';

export const JUDGING_CALLS: readonly ApiCall[] = [
  {
    method: 'post',
    path: '/products/{key}/evaluate',
    tag,
    summary: 'Judge now what is not judged yet',
    action: 'builds.evaluate',
    query: TeamQuery.extend(EvaluateQuery.shape),
    answers: {
      202: { description: 'The run, to be followed at /runs/{id}', content: json(JobRunView) },
      200: { description: 'With `wait=true`: the run at its end', content: json(JobRunView) },
    },
  },
  {
    method: 'get',
    path: '/runs/{id}',
    tag,
    summary: 'Follow a run',
    answers: { 200: { description: 'How far it is', content: json(JobRunView) } },
  },
  {
    method: 'get',
    path: '/products/{key}/verdicts',
    tag,
    summary: 'Read the judgement of one build, band by band',
    action: 'results.read',
    query: TeamQuery.extend(BuildQuery.shape),
    answers: { 200: { description: 'Verdicts with what they rest on', content: json(VerdictsView) } },
  },
  {
    method: 'get',
    path: '/products/{key}/gate',
    tag,
    summary: 'Ask whether a build may go on, for a build pipeline',
    description:
      '`pass`, `fail`, or `incomplete` when something was not measured or not judged, each with its reasons. ' +
      '`format=junit` answers the same as a JUnit report. Pre-compliance results, no certificate.',
    action: 'gate.read',
    query: TeamQuery.extend(GateQuery.shape),
    answers: {
      200: { description: 'The answer and why', content: { ...json(GateView), 'application/xml': z.string() } },
    },
  },
];
