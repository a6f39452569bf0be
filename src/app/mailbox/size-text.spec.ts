import { sizeText } from './size-text';

it.each([
  [812, '812 B'],
  [14_300, '14 kB'],
  [1_240_000, '1.2 MB'],
])('writes %d bytes as %s', (bytes, text) => {
  expect(sizeText(bytes)).toBe(text);
});
