import { declaredChanges } from './declared-changes';

const reference = {
  hardware: 'C1',
  firmware: '2.4.1',
  switching: [{ stage: 'PFC', frequencyHz: 65_000, spreadPercent: 4 }],
  parameters: [{ name: 'dead time', value: '120 ns' }],
};

describe('declaredChanges', () => {
  it('says nothing where nothing was declared to differ', () => {
    expect(declaredChanges(reference, { ...reference, parameters: [] }, [{ ...reference, parameters: [] }])).toEqual(
      [],
    );
  });

  it('tells revisions, switching frequencies and spreading apart', () => {
    const build = {
      hardware: 'C1',
      firmware: '2.5.0',
      switching: [
        { stage: 'PFC', frequencyHz: 78_000, spreadPercent: 0 },
        { stage: 'LLC', frequencyHz: 112_000, spreadPercent: 0 },
      ],
      parameters: [],
    };
    expect(declaredChanges(reference, build, [build])).toEqual([
      { what: 'Firmware', before: '2.4.1', now: '2.5.0' },
      { what: 'PFC switching frequency', before: '65 kHz', now: '78 kHz' },
      { what: 'PFC frequency spreading', before: '4 %', now: 'none' },
      { what: 'LLC switching frequency', before: 'not declared', now: '112 kHz' },
    ]);
  });

  it('gathers the parameters of every build since the reference', () => {
    const between = { ...reference, parameters: [{ name: 'snubber', value: '220 pF' }] };
    const build = {
      ...reference,
      parameters: [
        { name: 'dead time', value: '80 ns' },
        { name: 'snubber', value: '100 pF' },
      ],
    };
    expect(declaredChanges(reference, build, [between, build])).toEqual([
      { what: 'snubber', before: 'not declared', now: '220 pF; 100 pF' },
      { what: 'dead time', before: '120 ns', now: '80 ns' },
    ]);
  });
});
