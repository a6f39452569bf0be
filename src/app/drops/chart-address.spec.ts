import { addressOfView, viewOfAddress } from './chart-address';

it('shows the whole range without pins when the address says nothing', () => {
  expect(viewOfAddress({})).toEqual({ fromHz: 150_000, toHz: 30_000_000, pinsHz: [] });
  expect(addressOfView(viewOfAddress({}))).toEqual({ from: null, to: null, pins: null });
});

it.each([
  { fromHz: 150_000, toHz: 500_000, pinsHz: [156_043, 234_000] },
  { fromHz: 1_000_000, toHz: 30_000_000, pinsHz: [] },
  { fromHz: 150_000, toHz: 30_000_000, pinsHz: [156_043] },
])('comes back to the same view from the address it writes: %j', (view) => {
  const written = Object.entries(addressOfView(view)).filter(([, value]) => value !== null);
  expect(viewOfAddress(Object.fromEntries(written))).toEqual(view);
});

it.each([
  { from: 'abc', to: '500000' },
  { from: '500000', to: '150000' },
  { from: '9000', to: '500000' },
])('takes the whole range for %j', (address) => {
  expect(viewOfAddress(address)).toMatchObject({ fromHz: 150_000, toHz: 30_000_000 });
});
