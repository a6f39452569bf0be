import type { ProductSummary } from '@shared/contracts/products';
import { productLink, type ProductLink } from './product-link';

/** A product as table and cards show it. */
export interface ProductRow {
  id: string;
  product: ProductSummary;
  link: ProductLink;
  buildPath: readonly unknown[];
  /** Query of the team's list of drops that leaves this product's open ones. */
  dropsQuery: { product: string; state: 'open' };
}

export function productRows(teamKey: string, products: readonly ProductSummary[]): ProductRow[] {
  return products.map((product) => {
    const link = productLink(teamKey, product);
    return {
      id: `${product.team} ${product.key}`,
      product,
      link,
      buildPath: [...link.path, 'builds', product.latestBuild?.id ?? 0],
      dropsQuery: { product: product.key, state: 'open' },
    };
  });
}
