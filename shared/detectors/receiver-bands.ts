/** Settings of the measuring receiver in one CISPR band. Bandwidths are 6 dB bandwidths. */
export interface ReceiverBand {
  readonly bandwidthHz: number;
  readonly lowestBandwidthHz: number;
  readonly highestBandwidthHz: number;
}

/** 150 kHz to 30 MHz. Source: CISPR 16-1-1, receiver bandwidth of band B and its tolerance. */
export const RECEIVER_BAND_B: ReceiverBand = {
  bandwidthHz: 9_000,
  lowestBandwidthHz: 8_000,
  highestBandwidthHz: 10_000,
};
