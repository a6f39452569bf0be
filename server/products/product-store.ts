import { and, eq, inArray, or } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { products, productShares, teams } from '../db/schema';

export type Product = typeof products.$inferSelect;

export interface ProductOfTeam {
  product: Product;
  team: typeof teams.$inferSelect;
}

/** Products with this key that belong to one of the teams or are shared with one of them. */
export function findReachableProducts(db: Database, key: string, teamIds: readonly number[]): ProductOfTeam[] {
  const ids = [...teamIds];
  const shared = db
    .select({ id: productShares.productId })
    .from(productShares)
    .where(inArray(productShares.teamId, ids));
  return db
    .select({ product: products, team: teams })
    .from(products)
    .innerJoin(teams, eq(teams.id, products.teamId))
    .where(
      and(
        eq(products.key, key),
        eq(teams.isArchived, false),
        or(inArray(products.teamId, ids), inArray(products.id, shared)),
      ),
    )
    .all();
}

export function findProductById(db: Database, id: number): Product | undefined {
  return db.select().from(products).where(eq(products.id, id)).get();
}

/** Teams the product is shared with. */
export function shareTeamIds(db: Database, productId: number): number[] {
  return db
    .select({ teamId: productShares.teamId })
    .from(productShares)
    .where(eq(productShares.productId, productId))
    .all()
    .map((row) => row.teamId);
}
