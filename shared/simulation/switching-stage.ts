import type { InductorElement } from './filter-elements';

/** Points over one cycle of the slow modulation (half a mains period, an output period, a burst period). */
export const COURSE_SAMPLES = 48;

/** What happens to duty and swing over the slow cycle of a stage. */
export type OperatingCourse =
  /** Constant duty: a DC-DC stage in steady load. */
  | { kind: 'steady'; duty: number }
  /** Boost PFC in continuous conduction: d(t) = 1 - |v_mains(t)| / v_bus. */
  | { kind: 'boostPfc'; mainsPeakV: number; busV: number }
  /** Fixed duty, amplitude follows the rectified mains: a single-stage PFC in discontinuous conduction. */
  | { kind: 'rectifiedMains'; duty: number }
  /** Bridge leg of an inverter: d(t) = 1/2 + depth/2 sin. */
  | { kind: 'inverterLeg'; depth: number }
  /** Pulse bundles with pauses at light load; `onFraction` of the time at constant duty. */
  | { kind: 'burst'; duty: number; onFraction: number };

/** Deliberate or natural frequency modulation of a switching frequency. */
export interface Spreading {
  /** Peak-to-peak excursion over the switching frequency, in per cent. */
  peakToPeakPercent: number;
  modulationHz: number;
  profile: 'triangle' | 'sine';
}

/** How the switched node drives current around the line and neutral loop. */
export type DifferentialSource =
  /** Ripple of an input inductor. */
  | { kind: 'inductorRipple'; inductor: InductorElement }
  /** Pulsed switch current of the given height, in step with the node voltage. */
  | { kind: 'pulsedCurrent'; amplitudeA: number };

/** One switching stage of a converter, with all that shapes its emission. */
export interface SwitchingStage {
  key: string;
  frequencyHz: number;
  spreading: Spreading | null;
  course: OperatingCourse;
  /** Swing of the switched node against earth, V peak to peak. */
  swingV: number;
  riseTimeS: number;
  fallTimeS: number;
  /** Capacitance from the switched node to protective earth (heat sink, winding), F. */
  strayCapacitanceF: number;
  differential: DifferentialSource;
  /** Ringing of the commutation loop after each edge; the height is above the trapezoid's own spectrum. */
  ringing: { frequencyHz: number; quality: number; heightDb: number };
}

/** Duty and relative amplitude at one moment of the slow cycle. */
export interface OperatingPoint {
  duty: number;
  amplitude: number;
}

/**
 * Samples the slow cycle of a stage at equal times.
 *
 * @param course the kind of cycle and its parameters
 * @returns COURSE_SAMPLES points of duty (0..1) and relative amplitude (0..1); one point for a steady stage
 * Source: N. Mohan et al., Power Electronics, boost duty d = 1 - v_in / v_out and sine modulation of a bridge leg.
 * @example sampleCourse({ kind: 'steady', duty: 0.4 }) // [{ duty: 0.4, amplitude: 1 }]
 */
export function sampleCourse(course: OperatingCourse): OperatingPoint[] {
  if (course.kind === 'steady') {
    return [{ duty: course.duty, amplitude: 1 }];
  }
  return Array.from({ length: COURSE_SAMPLES }, (_, index) => pointOf(course, (index + 0.5) / COURSE_SAMPLES));
}

function pointOf(course: Exclude<OperatingCourse, { kind: 'steady' }>, phase: number): OperatingPoint {
  switch (course.kind) {
    case 'boostPfc':
      return { duty: 1 - (course.mainsPeakV * Math.sin(Math.PI * phase)) / course.busV, amplitude: 1 };
    case 'rectifiedMains':
      return { duty: course.duty, amplitude: Math.sin(Math.PI * phase) };
    case 'inverterLeg':
      return { duty: 0.5 + (course.depth / 2) * Math.sin(2 * Math.PI * phase), amplitude: 1 };
    case 'burst':
      return { duty: course.duty, amplitude: phase < course.onFraction ? 1 : 0 };
  }
}
