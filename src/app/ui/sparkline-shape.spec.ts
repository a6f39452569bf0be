import { sparklineShape } from './sparkline-shape';

it('breaks the line where nothing was measured and shows a lone build as a dot', () => {
  const shape = sparklineShape([9, 8, null, 7, null, 6, 5], 6, 120, 32);
  expect(shape.paths).toHaveLength(2);
  expect(shape.dots).toHaveLength(1);
  expect(shape.last).toMatchObject({ x: 117, isOver: false });
});

it('keeps limit and target in the picture and draws less margin lower down', () => {
  const shape = sparklineShape([12, -4], 6, 120, 32);
  expect(shape.limitY).toBeLessThan(29);
  expect(shape.targetY).toBeLessThan(shape.limitY);
  expect(shape.last).toMatchObject({ y: 29, isOver: true });
});

it('draws nothing but its guides when no build was measured', () => {
  expect(sparklineShape([null, null], null, 120, 32)).toMatchObject({ paths: [], dots: [], last: null, targetY: null });
});
