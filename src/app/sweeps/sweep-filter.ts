import { type Detector, DETECTORS, type Line, LINES, SWEEP_KINDS, type SweepKind } from '@shared/detectors/detectors';

/** Which sweeps the list shows; kept in the address. */
export interface SweepFilter {
  readonly product?: string;
  readonly build?: number;
  readonly state?: string;
  readonly bench?: string;
  readonly line?: Line;
  readonly detector?: Detector;
  readonly kind?: SweepKind;
}

export type SweepFilterName = keyof SweepFilter;

/** What stands in the address after the question mark; anything that is no filter, or none that exists, is left out. */
export function filterOfAddress(query: Readonly<Partial<Record<SweepFilterName, string>>>): SweepFilter {
  const build = Number(query.build);
  const all: SweepFilter = {
    product: query.product || undefined,
    build: Number.isInteger(build) && build > 0 ? build : undefined,
    state: query.state || undefined,
    bench: query.bench || undefined,
    line: LINES.find((line) => line === query.line),
    detector: DETECTORS.find((detector) => detector === query.detector),
    kind: SWEEP_KINDS.find((kind) => kind === query.kind),
  };
  return Object.fromEntries(Object.entries(all).filter(([, content]) => content !== undefined));
}

/** Query parameters of a changed filter: states and builds belong to a product, and a changed list begins at its top. */
export function addressOfChange(
  change: Partial<Record<SweepFilterName, string | null>>,
): Record<string, string | null> {
  const ofProduct = 'product' in change ? { build: null, state: null } : {};
  return { ...ofProduct, ...change, before: null };
}
