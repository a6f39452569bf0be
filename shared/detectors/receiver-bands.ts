/** Settings of the measuring receiver in one CISPR band. Bandwidths are 6 dB bandwidths. */
export interface ReceiverBand {
  readonly name: 'A' | 'B';
  readonly fromHz: number;
  readonly toHz: number;
  readonly bandwidthHz: number;
  readonly lowestBandwidthHz: number;
  readonly highestBandwidthHz: number;
}

/** Source: CISPR 16-1-1, receiver bandwidths and their tolerances, bands A and B. */
export const RECEIVER_BAND_A: ReceiverBand = {
  name: 'A',
  fromHz: 9_000,
  toHz: 150_000,
  bandwidthHz: 200,
  lowestBandwidthHz: 180,
  highestBandwidthHz: 220,
};

export const RECEIVER_BAND_B: ReceiverBand = {
  name: 'B',
  fromHz: 150_000,
  toHz: 30_000_000,
  bandwidthHz: 9_000,
  lowestBandwidthHz: 8_000,
  highestBandwidthHz: 10_000,
};
