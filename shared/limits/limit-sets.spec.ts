import { findLimitSet, LIMIT_SETS, lineForDetector } from './limit-sets';
import { CISPR32_B } from './tables/cispr-32';

describe('limit sets', () => {
  it('are found by their key, and only by it', () => {
    expect(findLimitSet('CISPR32_B')).toBe(CISPR32_B);
    expect(findLimitSet('CISPR32_C')).toBeUndefined();
    expect(new Set(LIMIT_SETS.map(({ key }) => key)).size).toBe(LIMIT_SETS.length);
  });

  it.each(LIMIT_SETS.map((set) => [set.key, set] as const))('%s states source, edition and caution', (_key, set) => {
    expect(set.source).toMatch(/Table A\.\d+/);
    expect(set.edition).toMatch(/CISPR 32/);
    expect(set.note).toBe('Check against your edition of the standard');
  });

  it.each(LIMIT_SETS.map((set) => [set.key, set] as const))('%s has segments that join without gaps', (_key, set) => {
    expect(set.lines.map(({ detector }) => detector)).toEqual(['QP', 'AV']);
    for (const { segments } of set.lines) {
      expect(segments[0].fromHz).toBe(150_000);
      expect(segments.at(-1)?.toHz).toBe(30_000_000);
      segments.slice(1).forEach((segment, i) => expect(segment.fromHz).toBe(segments[i].toHz));
    }
  });

  // Common practice, no source: a peak reading can only overstate, so it is held against the quasi-peak line.
  it('hold a peak reading against the quasi-peak line, other detectors against their own', () => {
    expect(lineForDetector(CISPR32_B, 'PK')?.detector).toBe('QP');
    expect(lineForDetector(CISPR32_B, 'QP')?.detector).toBe('QP');
    expect(lineForDetector(CISPR32_B, 'AV')?.detector).toBe('AV');
    expect(lineForDetector({ ...CISPR32_B, lines: [] }, 'AV')).toBeUndefined();
  });
});
