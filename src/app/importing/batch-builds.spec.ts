import type { ImportBatchView } from '@shared/contracts/imports';
import { batchBuilds } from './batch-builds';

type Item = ImportBatchView['items'][number];
const item = (buildId: number | null, worstMarginDb: number | null, status: Item['status'] = 'imported'): Item => ({
  id: 1,
  fileName: 'a.csv',
  tags: {},
  status,
  sweepId: buildId === null ? null : 7,
  productKey: buildId === null ? null : 'psu-240',
  productName: buildId === null ? null : 'Supply 240 W',
  buildId,
  worstMarginDb,
  problem: null,
});

describe('batchBuilds', () => {
  it('gathers the sweeps of each build, the build with the least margin first', () => {
    const items = [item(1, 9), item(2, 4.5), item(1, null), item(2, 6, 'duplicate'), item(null, null, 'refused')];
    expect(batchBuilds(items)).toEqual([
      { product: 'psu-240', productName: 'Supply 240 W', buildId: 2, sweeps: 2, worstMarginDb: 4.5 },
      { product: 'psu-240', productName: 'Supply 240 W', buildId: 1, sweeps: 2, worstMarginDb: 9 },
    ]);
  });
});
