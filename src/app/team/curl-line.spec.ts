import { execFileSync } from 'node:child_process';
import { curlLine, type CurlSample } from './curl-line';

const SAMPLE: CurlSample = {
  origin: 'http://localhost:3000',
  token: 'slt_1_secret',
  product: 'charger-750',
  hardware: 'C2',
  firmware: '4.1.0',
  state: "230 V, Mira's load",
  bench: 'bench-1',
};

/** What a shell makes of the line, one argument each, without curl. */
function argumentsOf(line: string): string[] {
  const script = `curl() { printf '%s\\n' "$@"; }\n${line}`;
  return execFileSync('sh', ['-c', script], { encoding: 'utf8' }).trimEnd().split('\n');
}

it('uploads a sweep with tags that a shell hands on as JSON, quotes in names included', () => {
  const [, authorization, , file, , tags, address] = argumentsOf(curlLine(['results:read', 'sweeps:write'], SAMPLE));
  expect(authorization).toBe('Authorization: Bearer slt_1_secret');
  expect(file).toBe('file=@sweep.csv');
  expect(JSON.parse(tags.replace('tags=', ''))).toEqual({
    product: 'charger-750',
    hardware: 'C2',
    firmware: '4.1.0',
    state: "230 V, Mira's load",
    bench: 'bench-1',
    line: 'L',
    detector: 'QP',
  });
  expect(address).toBe('http://localhost:3000/api/v1/sweeps');
});

it.each([
  [['gate:read', 'results:read'] as const, '/api/v1/products/charger-750/gate?hardware=C2&firmware=4.1.0%20beta'],
  [['results:read'] as const, '/api/v1/products/charger-750/verdicts?hardware=C2&firmware=4.1.0%20beta'],
])('asks with %j for what the token may read', (scopes, path) => {
  const [, , address] = argumentsOf(curlLine(scopes, { ...SAMPLE, firmware: '4.1.0 beta' }));
  expect(address).toBe(`http://localhost:3000${path}`);
});
