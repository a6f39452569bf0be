/** 6 dB bandwidth of the receiver between 150 kHz and 30 MHz. Source: CISPR 16-1-1, band B. */
export const BAND_B_BANDWIDTH_HZ = 9000;

/** Beyond this offset the filter is taken as closed (more than 110 dB down); real receivers stop at 60-80 dB. */
export const FILTER_REACH_HZ = 20_000;

/**
 * Amplitude response of the receiver's Gaussian filter, 1 at its centre and 1/2 at half the 6 dB bandwidth.
 *
 * G = 2^-(2 f / B6)^2, that is a rejection of 6.02 dB * (2 f / B6)^2
 *
 * @param offsetHz distance of the signal from the tuned frequency in Hz
 * @param bandwidthHz 6 dB bandwidth in Hz
 * @returns amplitude factor 0..1
 * Source: CISPR 16-1-1 defines the 6 dB bandwidth; the Gaussian shape is our own choice, usual in receivers with digital filters.
 * @example gaussianResponse(4500, 9000) // 0.5
 */
export function gaussianResponse(offsetHz: number, bandwidthHz: number = BAND_B_BANDWIDTH_HZ): number {
  const ratio = (2 * offsetHz) / bandwidthHz;
  return 2 ** -(ratio * ratio);
}
