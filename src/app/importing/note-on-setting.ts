/** Settings that differ by less are one, written with fewer digits; the server holds the same of bandwidths. */
const SAME = 0.001;

/**
 * What stands under a setting that files may state themselves: a tag that denies a file is refused on saving.
 *
 * @param tagged what the person typed; null for nothing
 * @param stated what the files state, each once
 */
export function noteOnSetting(
  tagged: number | null,
  stated: readonly number[],
  write: (setting: number) => string,
): string {
  const inFiles = stated.map(write).join(', ');
  if (tagged === null) return inFiles ? `In the files: ${inFiles}` : 'Empty: not known';
  const isDenied = stated.some((setting) => Math.abs(setting - tagged) > SAME * Math.abs(setting));
  return isDenied ? `Files say ${inFiles}: those would be refused` : '';
}
