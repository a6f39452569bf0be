import type { Detector, Line } from '../detectors/detectors';
import type { FrequencyUnit } from '../units/frequency-unit';
import type { LevelUnit } from '../units/level-unit';
import type { TableHeading } from './column-headings';
import { isFrequencyName } from './column-headings';
import type { PreambleFacts, Stated } from './preamble';
import { quote, ReadingError } from './reading-error';
import { detectorIn, lineIn } from './trace-name';
import type { StatedLevelUnit } from './unit-words';
import { frequencyUnitIn, levelUnitIn, withoutUnit } from './unit-words';

/** One column that holds a trace. */
export interface TraceColumn {
  /** From 0. */
  readonly column: number;
  readonly name: string;
  readonly levelUnit: LevelUnit;
  readonly detector?: Detector;
  readonly line?: Line;
}

/** A column that is read but left out, and why. */
export interface LeftOutColumn {
  readonly column: number;
  readonly why: string;
}

/** Columns that stand beside levels in exports but hold none. */
const NO_LEVEL_NAME = /margin|limit|delta|over|factor|correction|transducer|(?<![a-z])(?:no|nr|index)(?![a-z])/i;

/** The one column of frequencies: the first without a heading, else the one whose heading says so. */
export function frequencyColumnOf({ columns, line }: TableHeading): number {
  const named = columns.flatMap(({ name, unitText }, i) =>
    isFrequencyName(name || unitText) && levelUnitIn(unitText) === undefined ? [i] : [],
  );
  if (named.length > 1) {
    throw new ReadingError({
      line,
      column: named[1] + 1,
      found: `a second column of frequencies, ${quote(columns[named[1]].name || columns[named[1]].unitText)}`,
      expected: 'one column of frequencies for all levels',
      advice: 'Export traces with different frequencies into files of their own.',
    });
  }
  return named[0] ?? 0;
}

/** The frequency unit that the file states or the sender gave; undefined when neither does. */
export function statedFrequencyUnit(
  heading: TableHeading,
  frequencyColumn: number,
  facts: PreambleFacts,
  given: FrequencyUnit | undefined,
): FrequencyUnit | undefined {
  const inHeading = frequencyUnitIn(heading.columns.at(frequencyColumn)?.unitText ?? '');
  const stated: Stated<FrequencyUnit>[] = [...facts.frequencyUnits];
  if (inHeading !== undefined) stated.unshift({ value: inHeading, line: heading.line ?? 0 });
  return agreed('frequency unit', stated, given, frequencyColumn + 1);
}

/** All that one source says must be said by every other: the file twice, or the file and the sender. */
function agreed<T extends string>(
  what: string,
  stated: readonly Stated<T>[],
  given: T | undefined,
  column: number,
): T | undefined {
  const wanted = given ?? stated.at(0)?.value;
  const other = stated.find(({ value }) => value !== wanted);
  if (other === undefined) return wanted;
  throw new ReadingError({
    line: other.line,
    column,
    found: `the ${what} ${other.value}`,
    expected:
      given === undefined
        ? `${stated[0].value} as stated in line ${stated[0].line}`
        : `${given} as given with the file`,
    advice: given === undefined ? 'Correct the file.' : 'Leave the unit to the file, or correct it.',
  });
}

/**
 * Decides which columns are traces, and their names, units, detectors and lines.
 * @throws ReadingError for a level unit that is unknown, missing or contradicted, and when no column is a trace
 */
export function traceColumnsOf(
  heading: TableHeading,
  columnCount: number,
  frequencyColumn: number,
  facts: PreambleFacts,
  given: LevelUnit | undefined,
): { traces: TraceColumn[]; leftOut: LeftOutColumn[] } {
  const traces: TraceColumn[] = [];
  const leftOut: LeftOutColumn[] = [];
  for (let column = 0; column < columnCount; column++) {
    if (column === frequencyColumn) continue;
    const { name = '', unitText = '' } = heading.columns.at(column) ?? {};
    const stated = levelUnitIn(unitText);
    if (column < frequencyColumn || stated === 'dB' || NO_LEVEL_NAME.test(name)) {
      leftOut.push({ column, why: `${quote(name || unitText)} in its heading names no level` });
      continue;
    }
    const ownName = withoutUnit(name) || facts.traceNames.at(traces.length) || `Trace ${traces.length + 1}`;
    traces.push({
      column,
      name: ownName,
      levelUnit: levelUnitOf(stated, heading.line, column, facts, given),
      detector: detectorIn(ownName) ?? facts.settings.detector,
      line: lineIn(ownName),
    });
  }
  if (traces.length === 0) {
    throw new ReadingError({
      line: heading.line,
      column: null,
      found: 'no column of levels',
      expected: 'at least one column of levels in dBuV, dBm or dBmV',
      advice: leftOut.map(({ column, why }) => `Column ${column + 1} was left out: ${why}.`).join(' '),
    });
  }
  return { traces: withoutLoneL(traces), leftOut };
}

function levelUnitOf(
  inHeading: StatedLevelUnit | undefined,
  headingLine: number | null,
  column: number,
  facts: PreambleFacts,
  given: LevelUnit | undefined,
): LevelUnit {
  const all = [...facts.levelUnits];
  if (inHeading !== undefined) all.unshift({ value: inHeading, line: headingLine ?? 0 });
  const stated: Stated<LevelUnit>[] = [];
  for (const { value, line } of all) {
    if (typeof value === 'object') {
      throw new ReadingError({
        line,
        column: column + 1,
        found: `the level unit ${quote(value.other)}`,
        expected: 'dBuV, dBm or dBmV',
        advice: 'Export the levels as voltage or power at the 50 ohm receiver input.',
      });
    }
    if (value !== 'dB') stated.push({ value, line });
  }
  const unit = agreed('level unit', stated, given, column + 1);
  if (unit !== undefined) return unit;
  throw new ReadingError({
    line: headingLine,
    column: column + 1,
    found: 'no unit of level',
    expected: 'dBuV, dBm or dBmV, in the file or given with it',
    advice: 'Choose the level unit for this file, or name it in the heading.',
    needs: 'levelUnit',
  });
}

/** "L" alone may stand for level: it names a conductor only where another column names one too, or more of the name says so. */
function withoutLoneL(traces: readonly TraceColumn[]): TraceColumn[] {
  const others = traces.some(({ line }) => line !== undefined && line !== 'L');
  return traces.map((trace) => (trace.name.toUpperCase() === 'L' && !others ? { ...trace, line: undefined } : trace));
}
