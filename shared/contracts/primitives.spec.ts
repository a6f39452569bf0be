import { Email, Key, Name, Time, TimeZone } from './primitives';

const takes = (schema: typeof Name | typeof Email | typeof Time, text: string) => schema.safeParse(text).success;

describe('what people write', () => {
  it('in a name is one line', () => {
    expect(Name.parse('  Küche 2, 230 V ± 10 %  ')).toBe('Küche 2, 230 V ± 10 %');
    for (const name of ['', '   ', 'x'.repeat(121), 'a\nb', 'a\tb', 'a\u0000b']) expect(takes(Name, name)).toBe(false);
  });

  it('in a key is safe in an address', () => {
    expect(takes(Key, 'psu-240')).toBe(true);
    for (const key of ['', '-a', 'A', 'a/b', 'a b', '../a', 'a'.repeat(64)]) expect(takes(Key, key)).toBe(false);
  });

  it('in an e-mail address is compared in lower case', () => {
    expect(Email.parse(' Ada@Lab.Example ')).toBe('ada@lab.example');
    for (const email of ['ada', 'ada@lab.example\r\nBcc: all@lab.example', 'a@b.example, c@d.example']) {
      expect(takes(Email, email)).toBe(false);
    }
  });

  it('in a time names its zone', () => {
    expect(takes(Time, '2026-03-02T09:20:00+01:00')).toBe(true);
    for (const time of ['2026-03-02T09:20:00', '2026-02-30T09:20:00Z', '1772442000000']) {
      expect(takes(Time, time)).toBe(false);
    }
  });

  it('in a time zone is a name of the IANA list', () => {
    expect(takes(TimeZone, 'Europe/Lisbon')).toBe(true);
    expect(takes(TimeZone, 'Lisbon time')).toBe(false);
  });
});
