import { gapsOf, missingWords } from './tag-gaps';

const complete = {
  product: 'psu-240',
  hardware: 'C1',
  firmware: '2.4.1',
  state: '230 V full load',
  bench: 'bench-1',
  line: 'L',
  detector: 'QP',
};

describe('gapsOf', () => {
  it('finds nothing amiss in the tags that the interface requires', () => {
    expect(gapsOf(complete)).toEqual([]);
  });

  it('names every tag that is not there', () => {
    const tags = gapsOf({ product: 'psu-240', line: 'L' }).map(({ tag }) => tag);
    expect(tags.sort()).toEqual(['bench', 'detector', 'firmware', 'hardware', 'state']);
  });

  it('says what is wrong with what is there', () => {
    expect(gapsOf({ ...complete, rbwHz: -9000 })).toEqual([{ tag: 'rbwHz', fault: expect.stringContaining('>0') }]);
  });
});

describe('missingWords', () => {
  const gap = (tag: 'firmware' | 'detector' | 'rbwHz', fault = '') => ({ tag, fault });

  it('counts traces where not all of them lack a tag, and puts what all lack first', () => {
    const traces = [
      { gaps: [gap('detector'), gap('firmware')] },
      { gaps: [gap('firmware')] },
      { gaps: [gap('firmware'), gap('detector')] },
    ];
    expect(missingWords(traces)).toEqual(['firmware revision', 'detector of 2 traces']);
  });

  it('says what is wrong beside the tag', () => {
    expect(missingWords([{ gaps: [gap('rbwHz', 'too small')] }, { gaps: [] }])).toEqual([
      'resolution bandwidth (too small) of one trace',
    ]);
  });
});
