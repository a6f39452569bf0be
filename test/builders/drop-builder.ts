import type { DropEvidence, DropSighting, DropView, DropWitness } from '@shared/contracts/drops';
import type { BandJudgement } from '@shared/judging/band-judgement';

/** A comparison that lost 6.5 dB on L AV at the 2nd harmonic of a 78 kHz stage; the figures are invented. */
export function lostJudgement(given: Partial<BandJudgement> = {}): BandJudgement {
  return {
    stateId: 1,
    stateName: '230 V full load',
    line: 'L',
    detector: 'AV',
    limitLineKey: 'CISPR32_B/AV',
    band: '0.15-0.5 MHz',
    verdict: 'lost',
    differenceDb: -6.52,
    halfWidthDb: 0.97,
    interval: [-7.49, -5.55],
    p: 2.3e-15,
    adjustedP: 2.5e-14,
    thresholdDb: 2,
    targetMarginDb: 3,
    spread: { sdDb: 0.705, degreesOfFreedom: 47, source: 'own', text: 'from runs between which nothing changed' },
    buildRuns: 3,
    referenceRuns: 3,
    singleRun: false,
    meanMarginDb: -1.43,
    referenceMeanMarginDb: 5.09,
    previousDifferenceDb: -0.27,
    worst: { sweepId: 363, marginDb: -2.5, frequencyHz: 156_043, levelDbuv: 58.17, limitDbuv: 55.67 },
    referenceWorst: { sweepId: 225, marginDb: 4.55, frequencyHz: 195_134, levelDbuv: 49.27, limitDbuv: 53.82 },
    move: { moved: true, fromHz: 195_134, toHz: 156_043, levelChangeDb: 8.37, limitChangeDb: 1.85 },
    overLimit: true,
    underTarget: true,
    pConform: null,
    reasons: [],
    remarks: [],
    settles: [],
    buildSweepIds: [363, 381, 399],
    referenceSweepIds: [207, 225, 243],
    ...given,
  };
}

export function witness(given: Partial<BandJudgement> = {}): DropWitness {
  const judgement = lostJudgement(given);
  return { line: judgement.line, detector: judgement.detector, judgement };
}

/** The build that raised the drop of `dropView`. */
export function sighting(given: Partial<DropSighting> = {}): DropSighting {
  return {
    buildId: 16,
    hardware: 'C2',
    firmware: '4.1.0',
    differenceDb: -6.52,
    marginDb: -2.5,
    frequencyHz: 156_043,
    isOverLimit: true,
    ...given,
  };
}

type DropGiven = Partial<Omit<DropView, 'evidence'>> & { evidence?: Partial<DropEvidence> };

/** A new drop without an owner; give only what the case is about. */
export function dropView({ evidence, ...given }: DropGiven = {}): DropView {
  const witnesses = evidence?.witnesses ?? [witness()];
  return {
    id: 4,
    product: 'charger-750',
    productName: 'Heronsway 750 W charger',
    team: 'charging',
    buildId: 16,
    hardware: 'C2',
    firmware: '4.1.0',
    operatingState: '230 V full load',
    band: '0.15-0.5 MHz',
    state: 'new',
    owner: null,
    differenceDb: -6.52,
    marginDb: -2.5,
    frequencyHz: 156_043,
    isOverLimit: true,
    witnesses: witnesses.map(({ line, detector }) => ({ line, detector })),
    sentence: 'Firmware 4.1.0 lost 6.5 dB on L at 156 kHz (AV). 2.5 dB over the limit.',
    latest: sighting(),
    noLongerSeenIn: null,
    createdAt: '2026-11-29T10:35:00.000Z',
    updatedAt: '2026-11-29T10:35:00.000Z',
    buildSwitching: [{ stage: 'PFC', frequencyHz: 78_000, spreadPercent: 0 }],
    remarks: [],
    seenIn: [sighting()],
    fixedBy: null,
    history: [{ at: '2026-11-29T10:35:00.000Z', actor: 'judge', kind: 'raised', text: 'Raised.' }],
    moves: ['checking', 'causeKnown', 'fixed', 'accepted'],
    assignable: [{ id: 3, name: 'Ivo Brasted' }],
    ...given,
    evidence: {
      methodVersion: 1,
      limitSetKey: 'CISPR32_B',
      limitSetVersion: 1,
      thresholdDb: 2,
      targetMarginDb: 3,
      referenceKind: 'chosen',
      referenceBuilds: [{ id: 11, hardware: 'C2', firmware: '3.6.2' }],
      previousBuild: { id: 14, hardware: 'C2', firmware: '4.0.0' },
      buildSweepIds: [363, 381, 399],
      referenceSweepIds: [207, 225, 243],
      witnesses,
      setUp: [{ what: 'Bench', build: 'bench-1', reference: 'bench-1', isDifferent: false }],
      changes: [
        { what: 'Firmware', before: '3.6.2', now: '4.1.0' },
        { what: 'PFC switching frequency', before: '65 kHz', now: '78 kHz' },
      ],
      harmonic: { stage: 'PFC', order: 2, expectedHz: 156_000 },
      ...evidence,
    },
  };
}
