import {
  OverlayQuery,
  SweepPage,
  SweepQuery,
  SweepStored,
  SweepTags,
  SweepView,
  TraceView,
} from '@shared/contracts/sweeps';
import * as z from 'zod';
import { type ApiCall, Binary, json, TeamQuery } from './api-call';

const tag = 'Sweeps';
const FRAMES =
  'The binary form is one frame, little-endian: the four bytes SLF1, the length of the header as u32, the header as JSON ' +
  'padded to a multiple of eight bytes, then the frequency grids in Hz as Float64 and the levels in dBuV as Float32.';

export const SWEEP_CALLS: readonly ApiCall[] = [
  {
    method: 'post',
    path: '/sweeps',
    tag,
    summary: 'Import a sweep',
    description:
      'The instrument file as it is, and what it is of. Revisions and operating states that do not exist yet are created; ' +
      'product and bench are not. What the file states itself fills what the tags leave out; a contradiction is refused. ' +
      'The same file with the same tags again is answered with 200 and the sweep that stands.',
    action: 'sweeps.add',
    query: TeamQuery,
    body: { 'multipart/form-data': z.object({ file: Binary, tags: SweepTags }) },
    answers: {
      201: { description: 'Stored, with margins', content: json(SweepStored) },
      200: { description: 'There already; `duplicate` is true', content: json(SweepStored) },
    },
    problems: ['unreadable', 'contradiction', 'tooLarge'],
  },
  {
    method: 'get',
    path: '/sweeps',
    tag,
    summary: 'List sweeps, newest import first',
    action: 'results.read',
    query: SweepQuery,
    answers: { 200: { description: 'A page; go on with `before` set to `nextBefore`', content: json(SweepPage) } },
  },
  {
    method: 'get',
    path: '/sweeps/{id}',
    tag,
    summary: 'Read the record of a sweep',
    action: 'results.read',
    answers: { 200: { description: 'The record', content: json(SweepView) } },
  },
  {
    method: 'delete',
    path: '/sweeps/{id}',
    tag,
    summary: 'Remove a sweep that was wrong',
    description: 'Its build is judged again without it.',
    action: 'sweeps.remove',
    answers: { 204: { description: 'Removed' } },
    problems: ['conflict'],
  },
  {
    method: 'get',
    path: '/sweeps/{id}/trace',
    tag,
    summary: 'Read the corrected trace of a sweep',
    description: FRAMES,
    action: 'results.read',
    answers: {
      200: {
        description: 'The trace, in the form that `Accept` names',
        content: { ...json(TraceView), 'application/octet-stream': Binary },
      },
    },
  },
  {
    method: 'get',
    path: '/sweeps/{id}/file',
    tag,
    summary: 'Download the original file of a sweep',
    action: 'results.read',
    answers: { 200: { description: 'The bytes as they came', content: { 'application/octet-stream': Binary } } },
  },
  {
    method: 'get',
    path: '/overlay',
    tag,
    summary: 'Read many traces of a product for one picture',
    description: `Sweeps by number, and for every build the newest run of each series. ${FRAMES}`,
    action: 'results.read',
    query: OverlayQuery,
    answers: { 200: { description: 'A frame', content: { 'application/octet-stream': Binary } } },
  },
];
