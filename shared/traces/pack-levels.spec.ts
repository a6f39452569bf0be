import fc from 'fast-check';
import { packLevels, unpackLevels } from './pack-levels';

describe('packed levels', () => {
  it('take two bytes for levels written with two decimals, low bytes first', () => {
    const packed = packLevels(Float32Array.of(45.27, -3.5, 0));
    expect(packed.encoding).toBe('i16');
    // 4527 = 0x11af, -350 = 0xfea2 as 16 bits.
    expect([...packed.bytes]).toEqual([0xaf, 0xa2, 0x00, 0x11, 0xfe, 0x00]);
  });

  it.each([[45.273], [328], [-327.69], [43.7897], [NaN]])('keep 32 bits of a level of %d dB', (level) => {
    const packed = packLevels(Float32Array.of(45.27, level));
    expect(packed.encoding).toBe('f32');
    expect([...unpackLevels(packed)]).toEqual([Math.fround(45.27), Math.fround(level)]);
  });

  it('come back as the very numbers that went in, whatever they are', () => {
    const written = fc.integer({ min: -40_000, max: 40_000 }).map((centi) => Math.fround(centi / 100));
    const any = fc.float({ noNaN: true });
    fc.assert(
      fc.property(fc.oneof(fc.array(written), fc.array(any)), (numbers) => {
        const levels = Float32Array.from(numbers);
        const back = unpackLevels(packLevels(levels));
        expect(back).toHaveLength(levels.length);
        back.forEach((level, i) => expect(level === levels[i]).toBe(true));
      }),
    );
  });

  it('are always small for levels of two decimals within +-327.67 dB', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: -32_767, max: 32_767 })), (centi) => {
        expect(packLevels(Float32Array.from(centi, (one) => one / 100)).encoding).toBe('i16');
      }),
    );
  });

  it('do not share memory with the levels they came from', () => {
    const levels = Float32Array.of(1.2345, 2);
    const packed = packLevels(levels);
    levels[0] = 9;
    expect(unpackLevels(packed)[0]).toBe(Math.fround(1.2345));
  });

  it('are read from any place in a larger buffer', () => {
    const { encoding, bytes } = packLevels(Float32Array.of(1.2345, 2.3456));
    const larger = new Uint8Array(bytes.length + 3);
    larger.set(bytes, 3);
    expect([...unpackLevels({ encoding, bytes: larger.subarray(3) })]).toEqual([1.2345, 2.3456].map(Math.fround));
  });

  it('refuse bytes that are no whole number of levels', () => {
    expect(() => unpackLevels({ encoding: 'i16', bytes: new Uint8Array(3) })).toThrow(RangeError);
  });
});
