import { asciiJsonBytes, parseAsciiJson } from './ascii-json';

/**
 * Traces over HTTP in binary, so that a page draws them without parsing a number.
 *
 * Layout, little-endian:
 *   0       4 bytes  magic 'SLF1'
 *   4       u32      length of the header in bytes, a multiple of 8
 *   8       header   JSON in ASCII, padded with spaces: {"grids":[{"points":n}], "traces":[{"grid":i, "meta":{...}}]}
 *   8+len   grids    Float64 frequencies in Hz, one grid after the other in the order of the header
 *           traces   Float32 levels in dBuV, one trace after the other, as many as its grid has points
 * The padding keeps the grids on multiples of 8 bytes and the levels on multiples of 4: both are read in place.
 */
export interface Frames<Meta = Record<string, unknown>> {
  readonly grids: readonly Float64Array[];
  readonly traces: readonly FrameTrace<Meta>[];
}

export interface FrameTrace<Meta = Record<string, unknown>> {
  /** Index of the trace's grid. */
  readonly grid: number;
  /** Whatever a page has to know about the trace, as JSON. */
  readonly meta: Meta;
  readonly levelsDbuv: Float32Array;
}

interface FrameHeader<Meta> {
  readonly grids: readonly { readonly points: number }[];
  readonly traces: readonly { readonly grid: number; readonly meta: Meta }[];
}

const MAGIC = [0x53, 0x4c, 0x46, 0x31];
const PREFIX_BYTES = 8;

/**
 * Writes grids and traces into one binary frame.
 * @param frames grids in Hz, and traces in dBuV with the index of their grid
 * @returns the bytes of the layout above
 * @throws RangeError when a trace names no grid or has not as many levels as its grid has points
 */
export function encodeFrames<Meta>({ grids, traces }: Frames<Meta>): Uint8Array {
  for (const { grid, levelsDbuv } of traces) {
    if (levelsDbuv.length !== grids[grid]?.length) {
      throw new RangeError(
        `A trace of ${levelsDbuv.length} levels does not fit grid ${grid} of ${grids[grid]?.length} points.`,
      );
    }
  }
  const header: FrameHeader<Meta> = {
    grids: grids.map((grid) => ({ points: grid.length })),
    traces: traces.map(({ grid, meta }) => ({ grid, meta })),
  };
  const headerBytes = asciiJsonBytes(header);
  const headerLength = Math.ceil(headerBytes.length / 8) * 8;
  const arrays = [...grids, ...traces.map(({ levelsDbuv }) => levelsDbuv)];
  const bytes = new Uint8Array(arrays.reduce((sum, array) => sum + array.byteLength, PREFIX_BYTES + headerLength));
  bytes.set(MAGIC);
  new DataView(bytes.buffer).setUint32(4, headerLength, true);
  bytes.fill(0x20, PREFIX_BYTES, PREFIX_BYTES + headerLength);
  bytes.set(headerBytes, PREFIX_BYTES);
  let offset = PREFIX_BYTES + headerLength;
  for (const array of arrays) {
    bytes.set(new Uint8Array(array.buffer, array.byteOffset, array.byteLength), offset);
    offset += array.byteLength;
  }
  return bytes;
}

/**
 * Reads a binary frame. Grids and levels are views on the buffer where it starts on a multiple of 8 bytes, else on a copy.
 * NOTE: typed arrays have the byte order of the machine; every machine that runs a browser or Node today is little-endian.
 * @param source the bytes of encodeFrames
 * @returns grids and traces
 * @throws RangeError when the bytes are no such frame or end too early
 */
export function decodeFrames<Meta = Record<string, unknown>>(source: ArrayBuffer | Uint8Array): Frames<Meta> {
  const given = source instanceof Uint8Array ? source : new Uint8Array(source);
  const bytes = given.byteOffset % 8 === 0 ? given : given.slice();
  if (bytes.length < PREFIX_BYTES || MAGIC.some((byte, i) => bytes[i] !== byte)) {
    throw new RangeError('These bytes are no trace frame: they do not begin with SLF1.');
  }
  const headerLength = new DataView(bytes.buffer, bytes.byteOffset).getUint32(4, true);
  let offset = PREFIX_BYTES + headerLength;
  if (headerLength % 8 !== 0 || offset > bytes.length) {
    throw new RangeError(`A trace frame of ${bytes.length} bytes cannot hold a header of ${headerLength} bytes.`);
  }
  const header = parseAsciiJson(bytes.subarray(PREFIX_BYTES, offset)) as FrameHeader<Meta>;
  const take = (byteLength: number): number => {
    const start = bytes.byteOffset + offset;
    offset += byteLength;
    if (offset > bytes.length)
      throw new RangeError(`The trace frame ends at ${bytes.length} bytes, before its last array.`);
    return start;
  };
  const grids = header.grids.map(({ points }) => new Float64Array(bytes.buffer, take(8 * points), points));
  const traces = header.traces.map(({ grid, meta }): FrameTrace<Meta> => {
    const points = grids[grid].length;
    return { grid, meta, levelsDbuv: new Float32Array(bytes.buffer, take(4 * points), points) };
  });
  return { grids, traces };
}
