import { textParts } from './text-parts';

const OWN = { origin: 'http://localhost:3000', hostname: 'localhost', port: '3000' };

it('finds addresses in a text and leaves the marks after them to the sentence', () => {
  expect(textParts('Open http://localhost:3000/invitation/a-b_c, or (https://other.example/x).', OWN)).toEqual([
    { text: 'Open ' },
    { text: 'http://localhost:3000/invitation/a-b_c', address: 'http://localhost:3000/invitation/a-b_c' },
    { text: ', or (' },
    { text: 'https://other.example/x', address: 'https://other.example/x' },
    { text: ').' },
  ]);
});

it('leaves a text without addresses whole', () => {
  expect(textParts('five lines', OWN)).toEqual([{ text: 'five lines' }]);
  expect(textParts('', OWN)).toEqual([]);
});
