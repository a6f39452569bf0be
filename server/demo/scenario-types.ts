import type { Role } from '@shared/access/roles';
import type { DropState } from '@shared/contracts/drops';
import type { Detector, SweepKind } from '@shared/detectors/detectors';
import type { InputFilter } from '@shared/simulation/filter-elements';
import type { AmbientCarrier } from '@shared/simulation/ambient-carriers';
import type { OperatingCourse, Spreading, SwitchingStage } from '@shared/simulation/switching-stage';

/** The whole invented world of the demo. Nothing in it stands for a real company, person or product. */
export interface DemoScenario {
  company: string;
  teams: DemoTeam[];
  people: DemoPerson[];
  benches: DemoBench[];
  products: DemoProduct[];
}

export interface DemoTeam {
  key: string;
  name: string;
  timeZone: string;
  targetMarginDb: number;
}

export interface DemoPerson {
  name: string;
  email: string;
  isAdministrator: boolean;
  memberships: { teamKey: string; role: Role }[];
}

export interface DemoBench {
  key: string;
  name: string;
  location: string;
  lisn: string;
  receiver: string;
  notes: string;
  teamKeys: string[];
  noiseFigureDb: number;
  attenuationDb: number;
  padDb: number;
  ambient: AmbientCarrier[];
}

export interface DemoProduct {
  key: string;
  name: string;
  description: string;
  teamKey: string;
  limitSetKey: string;
  targetMarginDb: number;
  /** Teams that may read it. */
  sharedWith: string[];
  states: DemoState[];
  units: string[];
  hardwareRevisions: HardwareRevision[];
  firmwareRevisions: FirmwareRevision[];
  /** Oldest first. */
  builds: DemoBuild[];
  references: ReferenceChoice[];
  /** What people do about the drops of this product, once they have been found. */
  dropActions: DropAction[];
  /** Deviation of the clock: between units (constant) and between set-ups (temperature), standard deviation in per cent. */
  clockSpread: { unitPercent: number; sessionPercent: number };
}

export interface DemoState {
  name: string;
  supplyVoltageV: number;
  supplyFrequencyHz: number;
  load: string;
  mode: string;
  isRequired: boolean;
  /** How each stage works in this state; a stage that is missing does not switch. */
  operation: Record<string, StageOperation>;
}

export interface StageOperation {
  course: OperatingCourse;
  /** Switching frequency over the nominal one of the firmware. */
  frequencyFactor: number;
  /** Pulsed input current over that at full load. */
  currentFactor: number;
}

/** What the board decides about a stage. */
export type HardwareStage = Omit<SwitchingStage, 'frequencyHz' | 'spreading' | 'course'>;

export interface HardwareRevision {
  name: string;
  notes: string;
  filter: InputFilter;
  stages: HardwareStage[];
}

/** What the firmware decides about a stage. */
export interface FirmwareControl {
  frequencyHz: number;
  spreading: Spreading | null;
  /** Rise and fall time over that of the board, set by the strength of the gate driver. */
  edgeFactor: number;
}

export interface FirmwareRevision {
  name: string;
  commit: string;
  notes: string;
  control: Record<string, FirmwareControl>;
}

/** A pair of revisions, in the order they were built. */
export interface BuildName {
  hardware: string;
  firmware: string;
}

export interface DemoBuild extends BuildName {
  builtAtMs: number;
  changes: string[];
  /** Differences of the parts of this lot, as factors of their nominal values. */
  lot: { differentialInductance: number; capacitance: number };
  sessions: DemoSession[];
}

/** One run: both lines and all detectors of one state, taken together. */
export interface DemoSession {
  kind: SweepKind;
  state: string;
  bench: string;
  unit: string;
  run: string;
  /** Set-up of the day; runs with the same number on one build share it. */
  setUp: number;
  takenAtMs: number;
  /** What was entered for the pad in the cable, where that is not what was there. */
  padMistake: { padDb: number; enteredPadDb: number } | null;
  lines: ('L' | 'N')[];
  detectors: Detector[];
}

export interface ReferenceChoice {
  build: BuildName;
  chosenAtMs: number;
  chosenByEmail: string;
  reason: string;
}

/** What is done about the drops of a build; band null stands for every band. */
export interface DropAction {
  build: BuildName;
  band: string | null;
  ownerEmail: string;
  /** Days after the build on which it happens. */
  afterDays: number;
  becomes: DropState;
  fixedBy: BuildName | null;
  note: string;
}
