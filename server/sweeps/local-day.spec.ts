import { localDay } from './local-day';

describe('localDay', () => {
  it('is the date on the wall of the bench', () => {
    const at = Date.UTC(2026, 2, 2, 23, 30);
    expect(localDay(at, 'Europe/Lisbon')).toBe('2026-03-02');
    expect(localDay(at, 'Asia/Tokyo')).toBe('2026-03-03');
  });
});
