import { CISPR32_B } from '@shared/limits/tables/cispr-32';
import { previewMargin } from './preview-margin';

describe('previewMargin', () => {
  const frequenciesHz = Float64Array.of(150e3, 0.9e6, 1e6, 1.1e6, 30e6);

  it('holds each detector against its own line, and peak against quasi-peak', () => {
    // CISPR 32 class B, 0.5 to 5 MHz: QP 56 dBuV, AV 46 dBuV (table A.10). PK against QP: common practice, no source.
    const levels = Float32Array.of(20, 40, 50, 40, 20);
    expect(previewMargin(frequenciesHz, levels, CISPR32_B, 'QP')).toMatchObject({ marginDb: 6, frequencyHz: 1e6 });
    expect(previewMargin(frequenciesHz, levels, CISPR32_B, 'AV')).toMatchObject({ marginDb: -4 });
    expect(previewMargin(frequenciesHz, levels, CISPR32_B, 'PK')).toMatchObject({ marginDb: 6 });
  });
});
