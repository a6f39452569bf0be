import type { Detector, Line } from '@shared/detectors/detectors';
import { formatDecibels } from '@shared/units/format-decibels';
import { formatFrequency } from '@shared/units/format-frequency';
import { findCause, type HarmonicCause } from './find-cause';
import type { SwitchingStage } from './switching-stage';

export interface Revisions {
  readonly hardware: string;
  readonly firmware: string;
}

/** What a drop's sentence is made of. */
export interface DropFacts {
  readonly build: Revisions;
  /** Revisions of the reference; several builds pooled are named by their latest. */
  readonly reference: Revisions;
  /** Margin lost, dB, positive. */
  readonly lossDb: number;
  readonly line: Line;
  readonly detector: Detector;
  /** Worst point of the build now. */
  readonly frequencyHz: number;
  readonly marginDb: number;
  /** Worst point of the reference, and how far the level rose between the two. */
  readonly referenceFrequencyHz: number;
  readonly levelChangeDb: number;
  readonly bandFromHz: number;
  readonly bandToHz: number;
  readonly buildSwitching: readonly SwitchingStage[];
  readonly referenceSwitching: readonly SwitchingStage[];
  /** Uncertainty of a frequency found, Hz: half a step of the coarser grid. */
  readonly toleranceHz: number;
}

/** Names what is new in the build; both when both are, the pair when neither is. */
function subject({ build, reference }: DropFacts): string {
  const newFirmware = build.firmware !== reference.firmware;
  const newHardware = build.hardware !== reference.hardware;
  if (newFirmware && !newHardware) return `Firmware ${build.firmware}`;
  if (newHardware && !newFirmware) return `Hardware ${build.hardware}`;
  return `Hardware ${build.hardware} with firmware ${build.firmware}`;
}

/** 1st, 2nd, 3rd, 4th, 11th, 21st. */
function ordinal(order: number): string {
  const isTeen = order % 100 >= 11 && order % 100 <= 13;
  const ending = isTeen ? 'th' : (['th', 'st', 'nd', 'rd'][order % 10] ?? 'th');
  return `${order}${ending}`;
}

/** "130 to 156 kHz": the unit once when both share it. */
function fromTo(fromHz: number, toHz: number): string {
  const from = formatFrequency(fromHz);
  const to = formatFrequency(toHz);
  const [fromNumber, fromUnit] = from.split(' ');
  return fromUnit === to.split(' ')[1] ? `${fromNumber} to ${to}` : `${from} to ${to}`;
}

function causeClause(facts: DropFacts, cause: HarmonicCause): string | null {
  const harmonic = `the ${ordinal(cause.order)} harmonic of the ${cause.stage}`;
  if (cause.moved) {
    const cameIn = cause.fromHz < facts.bandFromHz || cause.fromHz > facts.bandToHz;
    return `${harmonic} moved from ${fromTo(cause.fromHz, cause.toHz)}${cameIn ? ', into the band' : ''}`;
  }
  // Only where both worst points are this harmonic is the change of level its own.
  const sameLine =
    Math.abs(facts.referenceFrequencyHz - cause.fromHz) <=
    Math.max(facts.toleranceHz, Math.abs(facts.frequencyHz - cause.toHz));
  if (!sameLine || facts.levelChangeDb <= 0) return null;
  return `${harmonic} at ${formatFrequency(cause.toHz)} rose by ${formatDecibels(facts.levelChangeDb)}`;
}

function marginLeft(marginDb: number): string {
  // Rounded to 0.1 dB a margin of -0.04 dB would read "0.0 dB left" though the limit is exceeded.
  if (marginDb < 0) return marginDb > -0.05 ? 'Just over the limit.' : `${formatDecibels(-marginDb)} over the limit.`;
  return `${formatDecibels(marginDb)} left to the limit.`;
}

/**
 * Says a drop in one sentence and the margin left in a second.
 *
 * A cause is stated only where the declared switching frequencies of both builds allow a single harmonic; otherwise the
 * sentence says what was measured and no more.
 *
 * @param facts levels and margins in dB, frequencies in Hz
 * @returns plain text
 * Throws RangeError on a tolerance of 0 or less.
 * Source: our own wording.
 * Example: "Firmware 2.5.0 lost 6.3 dB on L at 156 kHz (QP): the 2nd harmonic of the PFC moved from 130 to 156 kHz, into the
 * band. 1.4 dB left to the limit."
 */
export function describeDrop(facts: DropFacts): string {
  const { lossDb, line, detector, frequencyHz, marginDb } = facts;
  const what = `${subject(facts)} lost ${formatDecibels(lossDb)} on ${line} at ${formatFrequency(frequencyHz)} (${detector})`;
  const cause = findCause(frequencyHz, facts.buildSwitching, facts.referenceSwitching, facts.toleranceHz);
  const clause = cause && causeClause(facts, cause);
  return `${what}${clause ? `: ${clause}` : ''}. ${marginLeft(marginDb)}`;
}
