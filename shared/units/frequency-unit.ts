export const FREQUENCY_UNITS = ['Hz', 'kHz', 'MHz', 'GHz'] as const;
export type FrequencyUnit = (typeof FREQUENCY_UNITS)[number];

/** Power of ten that turns a number in the unit into Hz. */
export const FREQUENCY_EXPONENT: Readonly<Record<FrequencyUnit, number>> = { Hz: 0, kHz: 3, MHz: 6, GHz: 9 };
