import type { TokenScope } from '@shared/access/token-scopes';

/** What the example call is filled with; names that exist, so that it works as it stands. */
export interface CurlSample {
  origin: string;
  token: string;
  product: string;
  hardware: string;
  firmware: string;
  state: string;
  bench: string;
}

/** A call that can be pasted into a shell, for the most useful scope the token has. */
export function curlLine(scopes: readonly TokenScope[], sample: CurlSample): string {
  const { origin, token, product, hardware, firmware } = sample;
  const productPath = encodeURIComponent(product);
  const build = `hardware=${encodeURIComponent(hardware)}&firmware=${encodeURIComponent(firmware)}`;
  const start = `curl -H "Authorization: Bearer ${token}"`;
  if (scopes.includes('sweeps:write')) {
    return `${start} \\\n  -F file=@sweep.csv \\\n  -F '${tagsField(sample)}' \\\n  ${origin}/api/v1/sweeps`;
  }
  if (scopes.includes('gate:read')) return `${start} \\\n  "${origin}/api/v1/products/${productPath}/gate?${build}"`;
  return `${start} \\\n  "${origin}/api/v1/products/${productPath}/verdicts?${build}"`;
}

function tagsField({ product, hardware, firmware, state, bench }: CurlSample): string {
  const tags = JSON.stringify({ product, hardware, firmware, state, bench, line: 'L', detector: 'QP' });
  // Inside single quotes a shell knows no escape: the quote is closed, written and opened again.
  return `tags=${tags.replaceAll("'", `'\\''`)}`;
}
