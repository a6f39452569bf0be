import { onOwnOrigin } from './own-origin';

const OWN = { origin: 'http://127.0.0.1:3000', hostname: '127.0.0.1', port: '3000' };

it.each([
  [
    'http://localhost:3000/t/charging/drops/4?series=L%20QP#left',
    'http://127.0.0.1:3000/t/charging/drops/4?series=L%20QP#left',
  ],
  ['http://localhost:4000/t/charging', 'http://localhost:4000/t/charging'],
  ['https://strandline.brackenholt.example/reset/abc', 'https://strandline.brackenholt.example/reset/abc'],
  ['#below', '#below'],
])('opens %s at %s', (address, opened) => {
  expect(onOwnOrigin(address, OWN)).toBe(opened);
});
