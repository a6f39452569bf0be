import { BuildInput, BuildPatch, BuildSummary, BuildView } from '@shared/contracts/builds';
import { MarginMapView, SeriesFilter, TrendQuery, TrendView } from '@shared/contracts/margins';
import * as z from 'zod';
import { type ApiCall, json, TeamQuery } from './api-call';

const tag = 'Builds';

export const BUILD_CALLS: readonly ApiCall[] = [
  {
    method: 'get',
    path: '/products/{key}/builds',
    tag,
    summary: 'List the builds of a product, oldest first',
    action: 'results.read',
    query: TeamQuery,
    answers: { 200: { description: 'Builds in order', content: json(z.array(BuildSummary)) } },
  },
  {
    method: 'post',
    path: '/products/{key}/builds',
    tag,
    summary: 'Create a build',
    description: 'One pair of hardware and firmware revision; revisions that do not exist yet are created.',
    action: 'builds.edit',
    query: TeamQuery,
    body: json(BuildInput),
    answers: { 201: { description: 'Created', content: json(BuildView) } },
    problems: ['conflict'],
  },
  {
    method: 'get',
    path: '/products/{key}/builds/{id}',
    tag,
    summary: 'Read a build',
    action: 'results.read',
    query: TeamQuery,
    answers: { 200: { description: 'The build', content: json(BuildView) } },
  },
  {
    method: 'patch',
    path: '/products/{key}/builds/{id}',
    tag,
    summary: 'Change what is declared of a build',
    action: 'builds.edit',
    query: TeamQuery,
    body: json(BuildPatch),
    answers: { 200: { description: 'The changed build', content: json(BuildView) } },
  },
  {
    method: 'get',
    path: '/products/{key}/trend',
    tag,
    summary: 'Read the worst margin of every build',
    action: 'results.read',
    query: TeamQuery.extend(TrendQuery.shape),
    answers: { 200: { description: 'One point a build; null where nothing was measured', content: json(TrendView) } },
  },
  {
    method: 'get',
    path: '/products/{key}/margin-map',
    tag,
    summary: 'Read the worst margins of every build by frequency',
    action: 'results.read',
    query: TeamQuery.extend(SeriesFilter.shape),
    answers: { 200: { description: 'Builds by cells', content: json(MarginMapView) } },
  },
];
