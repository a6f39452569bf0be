import { SweepTags } from '@shared/contracts/sweeps';
import type { ReadTrace } from '@shared/traces/read-delimited';
import { contradictionOf } from './tag-contradiction';

const tags = SweepTags.parse({
  product: 'psu-240',
  hardware: 'C1',
  firmware: '2.4.1',
  state: 'full load',
  bench: 'bench-1',
  line: 'L',
  detector: 'QP',
  rbwHz: 9000,
  attenuationDb: 10,
});
const trace: ReadTrace = { name: 'Trace 1', levelUnit: 'dBuV', levelsDbuv: new Float32Array() };

function contradiction(read: Partial<ReadTrace>, settings = {}) {
  return contradictionOf(tags, { ...trace, ...read }, { settings, traces: [trace] });
}

describe('contradictionOf', () => {
  it('finds none where the file is silent or says the same', () => {
    expect(contradiction({})).toBeNull();
    expect(contradiction({ detector: 'QP', line: 'L' }, { rbwHz: 9000, attenuationDb: 10 })).toBeNull();
  });

  it('takes L1 for the phase of a single-phase supply', () => {
    expect(contradiction({ line: 'L1' })).toBeNull();
    expect(contradiction({ line: 'L2' })?.message).toBe('line: the file says L2, the tags say L');
  });

  it('takes a bandwidth written with fewer digits for the same', () => {
    expect(contradiction({}, { rbwHz: 9_004 })).toBeNull();
    expect(contradiction({}, { rbwHz: 10_000 })?.message).toBe('rbwHz: the file says 10 kHz, the tags say 9 kHz');
  });

  it('names another attenuation', () => {
    expect(contradiction({}, { attenuationDb: 20 })).toMatchObject({ found: '20 dB', expected: '10 dB' });
  });
});
