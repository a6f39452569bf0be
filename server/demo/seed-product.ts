import { SweepTags } from '@shared/contracts/sweeps';
import { editBuild } from '../builds/edit-build';
import { findBuildOf } from '../builds/find-build';
import { findOrCreateBuild } from '../builds/find-or-create-build';
import type { Context } from '../context';
import { judgeProductNow } from '../judging/judge-stale-builds';
import { chooseReference } from '../products/choose-reference';
import { createProduct } from '../products/edit-product';
import { createState } from '../products/edit-state';
import { type FoundProduct, findProduct } from '../products/find-product';
import { shareProduct } from '../products/share-product';
import { importSweep } from '../sweeps/import-sweep';
import { findTeam } from '../teams/find-team';
import type { BuildName, DemoBuild, DemoProduct, DemoScenario, DemoSession } from './scenario-types';
import { seedDropAction } from './seed-drop-action';
import { demoActor, demoActorWith } from './seed-people';
import { firmwareOf } from './simulate-condition';
import type { DemoSimulator } from './simulate-session';

/** The judging job runs a while after the last sweep of the day. */
const JUDGED_AFTER_MS = 2 * 3600_000;
const DAY_MS = 24 * 3600_000;

/** Something that happens to a product at a time. */
interface Happening {
  at: number;
  happen(context: Context): void;
}

/** Lives a product's history through, in the order of time, with the verbs that people and jobs use. */
export function seedProduct(
  context: Context,
  scenario: DemoScenario,
  product: DemoProduct,
  simulator: DemoSimulator,
): void {
  const lead = demoActorWith(context, scenario, product.teamKey, 'lead');
  const technician = demoActorWith(context, scenario, product.teamKey, 'technician');
  const found = (at: Context): FoundProduct => findProduct(at, lead, product.key, product.teamKey, 'products.edit');

  const happenings: Happening[] = product.builds.flatMap((build) => [
    { at: build.builtAtMs, happen: (at) => seedBuild(at, found(at), product, build) },
    ...build.sessions.map((session) => ({
      at: session.takenAtMs,
      happen: (at: Context) => importSession(at, build, session),
    })),
    { at: lastSweepAt(build) + JUDGED_AFTER_MS, happen: (at) => judgeProductNow(at, found(at).product.id) },
  ]);
  for (const choice of product.references) {
    happenings.push({
      at: choice.chosenAtMs,
      happen: (at) => {
        const { build } = findBuildOf(at, found(at).product.id, choice.build.hardware, choice.build.firmware);
        chooseReference(at, demoActor(at, choice.chosenByEmail), found(at), {
          buildId: build.id,
          reason: choice.reason,
        });
        judgeProductNow(at, found(at).product.id);
      },
    });
  }
  for (const action of product.dropActions) {
    const raisedOn = demoBuildOf(product, action.build);
    // "Fixed" must name a judged build that shows it.
    const judged = [raisedOn, ...(action.fixedBy ? [demoBuildOf(product, action.fixedBy)] : [])];
    const at = Math.max(
      raisedOn.builtAtMs + action.afterDays * DAY_MS,
      ...judged.map((build) => lastSweepAt(build) + 2 * JUDGED_AFTER_MS),
    );
    happenings.push({ at, happen: (then) => seedDropAction(then, found(then).product, action) });
  }

  const { key, name, description, limitSetKey, targetMarginDb } = product;
  const first = at(context, Math.min(...product.builds.map(({ builtAtMs }) => builtAtMs)) - DAY_MS);
  createProduct(first, lead, findTeam(first, lead, product.teamKey, 'products.edit'), {
    key,
    name,
    description,
    limitSetKey,
    targetMarginDb,
  });
  for (const { operation: _operation, ...state } of product.states)
    createState(first, lead, found(first).product, state);
  if (product.sharedWith.length > 0) shareProduct(first, lead, found(first), product.sharedWith);
  for (const happening of happenings.sort((a, b) => a.at - b.at)) happening.happen(at(context, happening.at));

  function importSession(then: Context, build: DemoBuild, session: DemoSession): void {
    const { fileName, bytes, tags } = simulator.simulateSession(product, build, session);
    for (const tag of tags) importSweep(then, technician, { bytes, fileName, tags: SweepTags.parse(tag) });
  }
}

function seedBuild(context: Context, { product }: FoundProduct, demo: DemoProduct, build: DemoBuild): void {
  const engineer = { kind: 'job', name: 'demo' } as const;
  const firmware = firmwareOf(demo, build);
  const hardware = demo.hardwareRevisions.find((revision) => revision.name === build.hardware);
  const created = findOrCreateBuild(context, engineer, product, {
    hardware: build.hardware,
    firmware: build.firmware,
    builtAt: build.builtAtMs,
  });
  editBuild(context, engineer, product, created.id, {
    commit: firmware.commit,
    firmwareNotes: firmware.notes,
    hardwareNotes: hardware?.notes ?? '',
    notes: build.changes.join(', '),
    switching: Object.entries(firmware.control).map(([stage, { frequencyHz, spreading }]) => ({
      stage,
      frequencyHz,
      spreadPercent: spreading?.peakToPeakPercent ?? 0,
    })),
    parameters: build.changes.map((change) => ({ name: 'changed', value: change })),
  });
}

function lastSweepAt(build: DemoBuild): number {
  return Math.max(build.builtAtMs, ...build.sessions.map(({ takenAtMs }) => takenAtMs));
}

function demoBuildOf(product: DemoProduct, { hardware, firmware }: BuildName): DemoBuild {
  const build = product.builds.find((one) => one.hardware === hardware && one.firmware === firmware);
  if (build === undefined)
    throw new Error(`the demo scenario has no build ${hardware} / ${firmware} of ${product.key}`);
  return build;
}

/** The context at another time. */
function at(context: Context, when: number): Context {
  return { ...context, now: () => when };
}
