import type { SweepView } from '@shared/contracts/sweeps';
import { overlayOf } from './ticked-sweeps';

const sweep = (id: number, product = 'psu-240') => ({ id, product, team: 'power' }) as SweepView;

describe('overlayOf', () => {
  it('leads to the overlay of the product with the ticked sweeps', () => {
    expect(overlayOf([sweep(12), sweep(15)])).toEqual({ product: 'psu-240', owner: 'power', sweeps: '12,15' });
  });

  it('says why there is none', () => {
    expect(overlayOf([])).toContain('Tick');
    expect(overlayOf([sweep(12), sweep(15, 'lamp')])).toContain('one product');
    expect(overlayOf(Array.from({ length: 41 }, (_, id) => sweep(id + 1)))).toContain('40 traces; 41 are ticked');
  });
});
