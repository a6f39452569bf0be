import { setImmediate } from 'node:timers/promises';
import { groupBy } from '@shared/collections/group-by';
import { bandsFor, teamBand } from '@shared/limits/bands';
import { refreshBandRemarks } from '@shared/traces/sweep-remarks';
import * as z from 'zod';
import type { Context } from '../context';
import type { TeamBand } from '../db/schema/teams';
import { isStorageFault } from '../db/is-storage-fault';
import { withTransaction } from '../db/with-transaction';
import { markStale } from '../judging/mark-stale';
import { rollUpBuild } from '../margins/roll-up-build';
import type { HeldRun } from '../queue/held-run';
import { ServiceError } from '../service-error';
import { teamById } from '../teams/find-team';
import { marginColumns } from './measure-sweep';
import { knownGrid, type PlannedLine, plannedLine } from './prepared-grids';
import { readTrace } from './read-trace';
import {
  listMeasuredSweeps,
  listSweepIds,
  type RemeasuredSweep,
  type SweepChange,
  updateSweep,
} from './remeasure-store';

const Payload = z.object({ teamId: z.int() });

/** Sweeps a transaction: short enough for an import to wait for. */
const BATCH_SIZE = 48;

/**
 * Takes the margins of a team's sweeps anew where they are not those of the team's present bands and the limit set's
 * present version, and has the builds concerned judged again. What is as it should be is left alone, so that a run that
 * was stopped goes on where it was.
 */
export async function remeasureSweeps(context: Context, held: HeldRun): Promise<void> {
  const { teamId } = Payload.parse(held.run.payload);
  // Sweeps that come in from here on are measured against the present bands.
  const ids = listSweepIds(context.db, teamId);
  held.expect(ids.length);
  for (let first = 0; first < ids.length; first += BATCH_SIZE) {
    for (const { sweepId, outcome } of remeasureBatch(context, teamId, ids.slice(first, first + BATCH_SIZE))) {
      if (outcome instanceof Error) held.note(`sweep ${sweepId}`, outcome);
      else held.advance(outcome);
    }
    // Lets the worker report that it is alive between two batches.
    await setImmediate();
  }
}

interface Remeasured {
  sweepId: number;
  outcome: 'remeasured' | 'unchanged' | Error;
}

function remeasureBatch(context: Context, teamId: number, ids: readonly number[]): Remeasured[] {
  return withTransaction(context.db, () => {
    const { bands } = teamById(context, teamId);
    const changed: RemeasuredSweep[] = [];
    const outcomes = listMeasuredSweeps(context.db, ids).map((sweep): Remeasured => {
      const change = changeOrError(context, sweep, bands);
      if (change === undefined) return { sweepId: sweep.id, outcome: 'unchanged' };
      if (change instanceof Error) return { sweepId: sweep.id, outcome: change };
      updateSweep(context.db, sweep.id, change);
      changed.push(sweep);
      return { sweepId: sweep.id, outcome: 'remeasured' };
    });
    for (const buildId of new Set(changed.map((sweep) => sweep.buildId))) rollUpBuild(context, buildId);
    for (const [productId, sweeps] of groupBy(changed, (sweep) => sweep.productId)) {
      markStale(context, productId, Math.min(...sweeps.map(({ position }) => position)) + 1);
    }
    return outcomes;
  });
}

/** A sweep that cannot be measured keeps what it has, and the others go on. */
function changeOrError(
  context: Context,
  sweep: RemeasuredSweep,
  teamBands: readonly TeamBand[],
): SweepChange | undefined | Error {
  try {
    const planned = plannedLine(sweep.plannedSetKey, sweep.detector);
    return isMeasuredAgainst(sweep, planned, teamBands) ? undefined : remeasure(context, sweep, planned, teamBands);
  } catch (error) {
    if (isStorageFault(error)) throw error;
    if (error instanceof ServiceError) return error;
    context.log.error({ err: error, sweep: sweep.id }, 'a sweep could not be measured again');
    return error instanceof Error ? error : new Error(String(error));
  }
}

/** The key of a band states its range, so that equal keys are equal bands. */
function isMeasuredAgainst(
  sweep: RemeasuredSweep,
  { set, line }: PlannedLine,
  teamBands: readonly TeamBand[],
): boolean {
  const keys = bandsFor(line, teamBands.map(teamBand)).map(({ key }) => key);
  return (
    sweep.limitSetKey === set.key &&
    sweep.limitSetVersion === set.version &&
    sweep.bands.length === keys.length &&
    sweep.bands.every(({ band }, index) => band === keys[index])
  );
}

function remeasure(
  context: Context,
  { id, gridHash, remarks }: RemeasuredSweep,
  planned: PlannedLine,
  teamBands: readonly TeamBand[],
): SweepChange {
  const { frequenciesHz, levelsDbuv } = readTrace(context, id);
  const margins = marginColumns(levelsDbuv, planned, knownGrid(gridHash, frequenciesHz, planned, teamBands));
  return { ...margins, remarks: refreshBandRemarks(remarks, margins.bands) };
}
