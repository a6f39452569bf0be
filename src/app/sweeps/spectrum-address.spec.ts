import { addressOfView, viewOfAddress } from './spectrum-address';

describe('view of a spectrum in the address', () => {
  it('comes back as it was kept', () => {
    const view = { fromHz: 500_000, toHz: 3_000_000, pinsHz: [1_000_000, 1_500_000] };
    const { fromHz, toHz, pins } = addressOfView(view);
    expect(viewOfAddress({ fromHz: fromHz ?? undefined, toHz: toHz ?? undefined, pins: pins ?? undefined })).toEqual(
      view,
    );
  });

  it('needs nothing for the whole range without pins', () => {
    expect(addressOfView({ fromHz: 150_000, toHz: 30_000_000, pinsHz: [] })).toEqual({
      fromHz: null,
      toHz: null,
      pins: null,
    });
  });

  it('leaves out what makes no sense', () => {
    expect(viewOfAddress({ fromHz: '3e6', toHz: '5e5', pins: 'x,-1,' })).toEqual({});
  });
});
