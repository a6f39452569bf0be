import { Key } from '@shared/contracts/primitives';
import { keyFromName } from './key-from-name';

describe('a key from a name', () => {
  it.each([
    ['Heronsway 750 W charger', 'heronsway-750-w-charger'],
    ['  Größe 2, Überspannung!', 'grosse-2-uberspannung'],
    ['--', ''],
  ])('writes %j as %j', (name, key) => {
    expect(keyFromName(name)).toBe(key);
  });

  it('is a valid key however long the name', () => {
    expect(Key.safeParse(keyFromName('board '.repeat(30))).success).toBe(true);
  });
});
