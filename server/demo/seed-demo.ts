import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { demoScenario } from './scenario';
import { demoPasswordHash, seedPeople } from './seed-people';
import { seedProduct } from './seed-product';
import { isEmpty } from './seed-store';
import { createDemoSimulator } from './simulate-session';

/** Fills an empty installation with the demo, all of it or nothing. Does nothing where somebody has been before. */
export async function seedDemoIfEmpty(context: Context): Promise<void> {
  if (!isEmpty(context.db)) return;
  const startedAt = performance.now();
  const scenario = demoScenario(context.now());
  const simulator = createDemoSimulator(scenario);
  const passwordHash = await demoPasswordHash();
  context.log.info('filling the empty data folder with the demo: a minute at most');
  withTransaction(context.db, () => {
    seedPeople(context, scenario, passwordHash);
    for (const product of scenario.products) {
      seedProduct(context, scenario, product, simulator);
      context.log.info({ product: product.key }, 'demo product is there');
    }
  });
  context.log.info({ seconds: Math.round((performance.now() - startedAt) / 1000) }, 'the demo is there');
}
