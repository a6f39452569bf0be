import { DropMove, DropNote, DropOwner, DropQuery, DropSummary, DropView } from '@shared/contracts/drops';
import * as z from 'zod';
import { type ApiCall, json, TeamQuery } from './api-call';

const tag = 'Drops';
const changed = { 200: { description: 'The changed drop', content: json(DropView) } };

export const DROP_CALLS: readonly ApiCall[] = [
  {
    method: 'get',
    path: '/products/{key}/drops',
    tag,
    summary: 'List the drops of a product',
    action: 'results.read',
    query: TeamQuery.extend(DropQuery.shape),
    answers: { 200: { description: 'Drops', content: json(z.array(DropSummary)) } },
  },
  {
    method: 'get',
    path: '/drops/{id}',
    tag,
    summary: 'Read a drop with its evidence and history',
    action: 'results.read',
    answers: { 200: { description: 'The drop', content: json(DropView) } },
  },
  {
    method: 'post',
    path: '/drops/{id}/moves',
    tag,
    summary: 'Move a drop to another state',
    description: '`fixed` names the build that shows it; `accepted` gives the reason in `note`.',
    action: 'drops.triage',
    body: json(DropMove),
    answers: changed,
    problems: ['conflict'],
  },
  {
    method: 'put',
    path: '/drops/{id}/owner',
    tag,
    summary: 'Say who looks after a drop',
    action: 'drops.triage',
    body: json(DropOwner),
    answers: changed,
  },
  {
    method: 'post',
    path: '/drops/{id}/notes',
    tag,
    summary: 'Add a note to a drop',
    action: 'drops.triage',
    body: json(DropNote),
    answers: changed,
  },
];
