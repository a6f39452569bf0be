import { LimitSetView } from '@shared/contracts/limits';
import * as z from 'zod';
import { type ApiCall, json } from './api-call';

export const LIMIT_CALLS: readonly ApiCall[] = [
  {
    method: 'get',
    path: '/limits',
    tag: 'Limits',
    summary: 'List the limit sets with their source',
    answers: { 200: { description: 'Limit sets', content: json(z.array(LimitSetView)) } },
  },
];
