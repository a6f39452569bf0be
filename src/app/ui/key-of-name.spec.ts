import { Key } from '@shared/contracts/primitives';
import { keyOfName } from './key-of-name';

describe('keyOfName', () => {
  it.each([
    ['Bench 2, hall B', 'bench-2-hall-b'],
    ['Heronsway 750 W charger', 'heronsway-750-w-charger'],
    ['  Größe 2, Überspannung!', 'grosse-2-uberspannung'],
    ['PRÜFSTRASSE ẞ', 'prufstrasse-ss'],
    ['x'.repeat(62) + ' y', 'x'.repeat(62)],
    ['board '.repeat(30), 'board-'.repeat(10) + 'boa'],
  ])('makes a key that the server takes of "%s"', (name, key) => {
    expect(keyOfName(name)).toBe(key);
    expect(Key.safeParse(key).success).toBe(true);
  });

  it('suggests none where a name has no letter and no digit', () => {
    expect(keyOfName('--')).toBe('');
  });
});
