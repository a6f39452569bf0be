/** A choice of a reference build; null: back to the pooled mean. */
export interface ReferenceChoice {
  readonly buildId: number | null;
  /** Position of the build among the product's builds. */
  readonly position: number | null;
}

/**
 * The reference build the team's choices name for a build at a position: the newest choice of an older build.
 *
 * A reference serves the builds after it. Those before keep the reference they were judged against, so that a new choice
 * rewrites no history.
 *
 * @param choices newest first
 * @returns the build's id, or null for the pooled mean
 */
export function referenceInForce(choices: readonly ReferenceChoice[], position: number): number | null {
  const choice = choices.find((one) => one.position === null || one.position < position);
  return choice?.buildId ?? null;
}
