import type { SpectrumView } from '../../ui/chart/spectrum-types';

/** Row ids in an address: "16,11,14". Anything that is no id is left out. */
export function idsOf(text: string | undefined): number[] {
  const ids = (text ?? '').split(',').map(Number);
  return [...new Set(ids.filter((id) => Number.isSafeInteger(id) && id > 0))];
}

/** The zoom and the pins of an address; what does not make sense is left out. */
export function spectrumViewOf(
  fromText: string | undefined,
  toText: string | undefined,
  pinsText: string | undefined,
): Partial<SpectrumView> {
  const [fromHz, toHz] = [Number(fromText), Number(toText)];
  return {
    ...(fromHz > 0 && toHz > fromHz && { fromHz, toHz }),
    ...(pinsText && { pinsHz: idsOf(pinsText) }),
  };
}

/** The part of the address that keeps a view; the whole range and no pins need none. */
export function spectrumQuery({ fromHz, toHz, pinsHz }: SpectrumView, whole: { fromHz: number; toHz: number }) {
  const isWhole = fromHz === whole.fromHz && toHz === whole.toHz;
  return {
    fromHz: isWhole ? null : fromHz,
    toHz: isWhole ? null : toHz,
    pins: pinsHz.length === 0 ? null : pinsHz.join(','),
  };
}
