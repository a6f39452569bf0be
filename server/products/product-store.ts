import { and, asc, count, desc, eq, inArray, isNull, or, sql } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { prepared } from '../db/prepared';
import { people, products, productShares, referenceChoices, sweeps, teams, verdicts } from '../db/schema';

export type Product = typeof products.$inferSelect;
export type Team = typeof teams.$inferSelect;

export interface ProductOfTeam {
  product: Product;
  team: Team;
}

/** Of the placeholder `teamIds`, a JSON array: one statement serves any number of teams. */
function isReachable(db: Database) {
  const ids = sql`(select value from json_each(${sql.placeholder('teamIds')}))`;
  const shared = db
    .select({ id: productShares.productId })
    .from(productShares)
    .where(inArray(productShares.teamId, ids));
  return and(eq(teams.isArchived, false), or(inArray(products.teamId, ids), inArray(products.id, shared)));
}

function productsOfTeams(db: Database) {
  return db.select({ product: products, team: teams }).from(products).innerJoin(teams, eq(teams.id, products.teamId));
}

const reachableByKey = prepared((db) =>
  productsOfTeams(db)
    .where(and(eq(products.key, sql.placeholder('key')), isReachable(db)))
    .prepare(),
);

/** Products with this key that belong to one of the teams or are shared with one of them, archived ones too. */
export function findReachableProducts(db: Database, key: string, teamIds: readonly number[]): ProductOfTeam[] {
  return reachableByKey(db).all({ key, teamIds: JSON.stringify(teamIds) });
}

const reachableInUse = prepared((db) =>
  productsOfTeams(db)
    .where(and(isReachable(db), isNull(products.archivedAt)))
    .orderBy(asc(products.name))
    .prepare(),
);

/** Products that belong to one of the teams or are shared with one of them, by name. */
export function listReachableProducts(db: Database, teamIds: readonly number[]): ProductOfTeam[] {
  return reachableInUse(db).all({ teamIds: JSON.stringify(teamIds) });
}

export function findProductById(db: Database, id: number): Product | undefined {
  return db.select().from(products).where(eq(products.id, id)).get();
}

export function insertProduct(db: Database, product: typeof products.$inferInsert): Product | undefined {
  return db.insert(products).values(product).onConflictDoNothing().returning().get();
}

export function updateProduct(db: Database, id: number, change: Partial<typeof products.$inferInsert>): Product {
  return db.update(products).set(change).where(eq(products.id, id)).returning().get();
}

/** Teams the product is shared with. */
export function listShares(db: Database, productId: number): Team[] {
  return db
    .select({ team: teams })
    .from(productShares)
    .innerJoin(teams, eq(teams.id, productShares.teamId))
    .where(eq(productShares.productId, productId))
    .orderBy(asc(teams.name))
    .all()
    .map((row) => row.team);
}

/** Replaces the teams the product is shared with. */
export function replaceShares(
  db: Database,
  productId: number,
  teamIds: readonly number[],
  by: { personId: number; at: number },
): void {
  db.delete(productShares).where(eq(productShares.productId, productId)).run();
  for (const teamId of teamIds) {
    db.insert(productShares).values({ productId, teamId, sharedBy: by.personId, createdAt: by.at }).run();
  }
}

export function listTeamsByKey(db: Database, keys: readonly string[]): Team[] {
  return db
    .select()
    .from(teams)
    .where(and(inArray(teams.key, [...keys]), eq(teams.isArchived, false)))
    .all();
}

export function insertReferenceChoice(db: Database, choice: typeof referenceChoices.$inferInsert): void {
  db.insert(referenceChoices).values(choice).run();
}

/** The last choice of a reference, with the name of who made it. */
export function latestReferenceChoice(db: Database, productId: number) {
  return db
    .select({
      buildId: referenceChoices.buildId,
      chosenAt: referenceChoices.chosenAt,
      reason: referenceChoices.reason,
      chosenBy: people.name,
    })
    .from(referenceChoices)
    .innerJoin(people, eq(people.id, referenceChoices.chosenBy))
    .where(eq(referenceChoices.productId, productId))
    .orderBy(desc(referenceChoices.id))
    .limit(1)
    .get();
}

/** Changes of margin and worst margins of a build's judged bands, read without the judgements themselves. */
export function listChanges(db: Database, buildId: number) {
  const { stateId, line, detector, band, verdict, differenceDb, worstMarginDb: worst } = verdicts;
  return db
    .select({ stateId, line, detector, band, verdict, differenceDb, worst })
    .from(verdicts)
    .where(eq(verdicts.buildId, buildId))
    .orderBy(asc(verdicts.id))
    .all();
}

/** Whether any sweep of the product exists. */
export function countSweeps(db: Database, productId: number): number {
  return db.select({ sweeps: count() }).from(sweeps).where(eq(sweeps.productId, productId)).get()?.sweeps ?? 0;
}
