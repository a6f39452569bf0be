import { setImmediate } from 'node:timers/promises';
import * as z from 'zod';
import type { Context } from '../context';
import type { HeldRun } from '../queue/held-run';
import { judgeOneBuild, type JudgedBuildOutcome } from './judge-one-build';
import { listStaleBuilds } from './stale-store';

const Payload = z.object({ productId: z.int() });

/**
 * Judges every build of a product that is not judged yet, oldest first, since later ones are compared with earlier ones.
 * Each build is stored by itself; one that fails is noted and left for the next run. Ends when nothing is left, data that
 * came in meanwhile included.
 */
export async function judgeStaleBuilds(context: Context, held: HeldRun): Promise<void> {
  const { productId } = Payload.parse(held.run.payload);
  const failed = new Set<number>();
  for (let done = 0; ; done++) {
    const waiting = listStaleBuilds(context.db, productId).filter(({ id }) => !failed.has(id));
    held.expect(done + waiting.length);
    const next = waiting[0];
    if (next === undefined) return;
    const outcome = judgeOrError(context, next.id);
    if (outcome instanceof Error) {
      failed.add(next.id);
      context.log.error({ err: outcome, build: next.id }, 'a build could not be judged');
      held.note(`${next.hardware} / ${next.firmware}`, outcome);
    } else {
      held.advance(outcome.verdict ?? 'unmeasured');
    }
    // Lets the worker report that it is alive between two builds.
    await setImmediate();
  }
}

/** Judges what is not judged yet of a product, here and now. @throws whatever stops one of its builds */
export function judgeProductNow(context: Context, productId: number): void {
  const next = () => listStaleBuilds(context.db, productId)[0];
  for (let build = next(); build !== undefined; build = next()) judgeOneBuild(context, build.id);
}

function judgeOrError(context: Context, buildId: number): JudgedBuildOutcome | Error {
  try {
    return judgeOneBuild(context, buildId);
  } catch (error) {
    return error instanceof Error ? error : new Error(String(error));
  }
}
