import { Key } from '@shared/contracts/primitives';
import { keyOfName } from './key-of-name';

describe('keyOfName', () => {
  it.each([
    ['Bench 2, hall B', 'bench-2-hall-b'],
    ['  Prüfplatz 3 ', 'prufplatz-3'],
    ['x'.repeat(62) + ' y', 'x'.repeat(62)],
  ])('makes a key that the server takes of "%s"', (name, key) => {
    expect(keyOfName(name)).toBe(key);
    expect(Key.safeParse(key).success).toBe(true);
  });
});
