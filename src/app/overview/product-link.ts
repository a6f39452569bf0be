import type { ProductSummary } from '@shared/contracts/products';

/** Address of a product's page; one that another team owns is named with its owner. */
export interface ProductLink {
  path: readonly string[];
  query: { owner?: string };
}

export function productLink(teamKey: string, { key, team, isShared }: ProductSummary): ProductLink {
  return { path: ['/t', teamKey, 'products', key], query: isShared ? { owner: team } : {} };
}
