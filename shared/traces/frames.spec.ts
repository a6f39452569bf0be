import fc from 'fast-check';
import type { FrameTrace } from './frames';
import { decodeFrames, encodeFrames } from './frames';

const grids = [Float64Array.of(150_000, 154_500, 159_000), Float64Array.of(1e6, 2e6)];
const traces: FrameTrace<{ name: string; run: number | null }>[] = [
  { grid: 0, meta: { name: 'C1 / 2.4.1', run: 7 }, levelsDbuv: Float32Array.of(40.1, 41.2, 39.9) },
  { grid: 1, meta: { name: 'before – “first” µ', run: null }, levelsDbuv: Float32Array.of(30, 31) },
];

describe('trace frames', () => {
  it('come back as they went in', () => {
    expect(decodeFrames(encodeFrames({ grids, traces }))).toEqual({ grids, traces });
  });

  it('begin with SLF1 and keep grids on multiples of 8 bytes, whatever the header', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), fc.array(fc.double()), (name, numbers) => {
        const gridHz = Float64Array.from(numbers);
        const levelsDbuv = Float32Array.from(numbers);
        const bytes = encodeFrames({ grids: [gridHz], traces: [{ grid: 0, meta: { name }, levelsDbuv }] });
        expect(String.fromCharCode(...bytes.subarray(0, 4))).toBe('SLF1');
        const back = decodeFrames(bytes);
        expect(back.grids[0].byteOffset % 8).toBe(0);
        expect(back.traces[0].levelsDbuv.byteOffset % 4).toBe(0);
        expect(back).toEqual({ grids: [gridHz], traces: [{ grid: 0, meta: { name }, levelsDbuv }] });
      }),
    );
  });

  it('are views on the bytes where these are aligned, and read all the same where they are not', () => {
    const bytes = encodeFrames({ grids, traces });
    expect(decodeFrames(bytes.buffer as ArrayBuffer).grids[0].buffer).toBe(bytes.buffer);
    const shifted = new Uint8Array(bytes.length + 3);
    shifted.set(bytes, 3);
    expect(decodeFrames(shifted.subarray(3))).toEqual({ grids, traces });
  });

  it('hold the numbers in little-endian order behind the header', () => {
    const bytes = encodeFrames({ grids, traces });
    const view = new DataView(bytes.buffer);
    const dataOffset = 8 + view.getUint32(4, true);
    expect(view.getFloat64(dataOffset, true)).toBe(150_000);
    expect(view.getFloat32(dataOffset + 8 * 5, true)).toBe(Math.fround(40.1));
    expect(bytes).toHaveLength(dataOffset + 8 * 5 + 4 * 5);
  });

  it('refuse a trace that does not fit its grid', () => {
    const levelsDbuv = Float32Array.of(1);
    expect(() => encodeFrames({ grids, traces: [{ grid: 0, meta: {}, levelsDbuv }] })).toThrow(RangeError);
    expect(() => encodeFrames({ grids, traces: [{ grid: 2, meta: {}, levelsDbuv }] })).toThrow(RangeError);
  });

  it('refuse bytes that are no frame or end too early', () => {
    const bytes = encodeFrames({ grids, traces });
    expect(() => decodeFrames(Uint8Array.of(1, 2, 3))).toThrow('do not begin with SLF1');
    expect(() => decodeFrames(bytes.subarray(0, bytes.length - 4))).toThrow('before its last array');
    expect(() => decodeFrames(bytes.subarray(0, 16))).toThrow('cannot hold a header');
  });
});
