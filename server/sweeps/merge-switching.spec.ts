import { mergeSwitching } from './merge-switching';

const pfc = { stage: 'PFC', frequencyHz: 65_000, spreadPercent: 0 };
const llc = { stage: 'LLC', frequencyHz: 110_000, spreadPercent: 4 };

describe('mergeSwitching', () => {
  it('adds stages that are not declared yet', () => {
    expect(mergeSwitching([pfc], [llc])).toEqual({ switching: [pfc, llc], isChanged: true, contradictions: [] });
  });

  it('changes nothing where the tags say nothing or the same', () => {
    expect(mergeSwitching([pfc, llc])).toMatchObject({ isChanged: false, contradictions: [] });
    expect(mergeSwitching([pfc, llc], [llc])).toMatchObject({ isChanged: false, contradictions: [] });
  });

  it('keeps what is declared and tells of the other value', () => {
    const { switching, isChanged, contradictions } = mergeSwitching([pfc], [{ ...pfc, spreadPercent: 6 }]);
    expect({ switching, isChanged }).toEqual({ switching: [pfc], isChanged: false });
    expect(contradictions).toEqual([
      'the tags say that PFC switches at 65 kHz spread over 6 %, the build declares 65 kHz',
    ]);
  });
});
