import type { LimitDetector } from '../limits/limit-line';

/** Peak, quasi-peak and CISPR-average, the detectors of mains-port limits. */
export const DETECTORS = ['PK', 'QP', 'AV'] as const satisfies readonly LimitDetector[];
export type Detector = (typeof DETECTORS)[number];

/** Conductors a sweep may be taken on: single-phase and three-phase mains, DC supplies. */
export const LINES = ['L', 'N', 'L1', 'L2', 'L3', '+', '-'] as const;
export type Line = (typeof LINES)[number];

/** What was connected: the product, nothing (bench background), or a source that checks the bench. */
export const SWEEP_KINDS = ['product', 'background', 'checkSource'] as const;
export type SweepKind = (typeof SWEEP_KINDS)[number];
