import { addressOfChange, filterOfAddress } from './sweep-filter';

describe('filterOfAddress', () => {
  it('reads what it knows', () => {
    expect(
      filterOfAddress({
        product: 'psu-240',
        build: '17',
        state: '230 V',
        line: 'N',
        detector: 'AV',
        kind: 'background',
      }),
    ).toEqual({ product: 'psu-240', build: 17, state: '230 V', line: 'N', detector: 'AV', kind: 'background' });
  });

  it('leaves out what is empty or does not exist', () => {
    expect(filterOfAddress({ product: '', build: '-3', line: 'Q', detector: 'max', kind: 'x' })).toEqual({});
  });
});

describe('addressOfChange', () => {
  it('goes back to the top of the list', () => {
    expect(addressOfChange({ line: 'N' })).toEqual({ line: 'N', before: null });
  });

  it('drops build and state of another product', () => {
    expect(addressOfChange({ product: 'psu-240' })).toEqual({
      product: 'psu-240',
      build: null,
      state: null,
      before: null,
    });
  });
});
