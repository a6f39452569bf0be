import type { SweepTagsInput } from '@shared/contracts/sweeps';
import { createRandom } from '@shared/simulation/random-generator';

const POINTS = 6_634;
const START_HZ = 150_000;
const STEP_HZ = 4_500;
const SWITCHING_HZ = 132_000;

/** Text of a made-up sweep: floor, harmonics of 132 kHz through a 9 kHz filter, jitter of 0.6 dB, levels to 0.01 dB. */
export function syntheticSweep(seed: number): Buffer {
  const random = createRandom(seed);
  const rows = ['Frequency [Hz];Level [dBuV]'];
  for (let i = 0; i < POINTS; i++) {
    const frequencyHz = START_HZ + i * STEP_HZ;
    const order = Math.max(1, Math.round(frequencyHz / SWITCHING_HZ));
    const offHz = frequencyHz - order * SWITCHING_HZ;
    const lineDbuv = 58 - 20 * Math.log10(order) - 24.08 * (offHz / 9_000) ** 2;
    const floorDbuv = 14 + 4 * Math.log10(30e6 / frequencyHz);
    rows.push(`${frequencyHz};${(Math.max(lineDbuv, floorDbuv) + 0.6 * random.nextNormal()).toFixed(2)}`);
  }
  return Buffer.from(`${rows.join('\n')}\n`);
}

const SERIES = 40;

/** Tags of the sweep with this number: 40 sweeps a build, in five states on two lines with two detectors, two runs each. */
export function syntheticTags(number: number): SweepTagsInput {
  const build = Math.floor(number / SERIES);
  const series = number % SERIES;
  return {
    product: 'bench-product',
    hardware: `C${1 + Math.floor(build / 10)}`,
    firmware: `2.${build}`,
    state: `state ${series % 5}`,
    bench: 'bench-1',
    line: series % 2 ? 'L' : 'N',
    detector: series % 4 < 2 ? 'QP' : 'AV',
    run: `run ${series < SERIES / 2 ? 1 : 2}`,
    takenAt: new Date(Date.UTC(2026, 2, 1) + build * 86_400_000).toISOString(),
    rbwHz: 9_000,
    corrected: true,
  };
}
