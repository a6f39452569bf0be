/** The product's target margin in dB: its own, or else the team's. */
export function targetMarginOf(product: { targetMarginDb: number | null }, team: { targetMarginDb: number }): number {
  return product.targetMarginDb ?? team.targetMarginDb;
}
