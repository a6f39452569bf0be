import { detectorIn, lineIn } from './trace-name';

describe('names of traces', () => {
  it.each([
    ['QP', 'QP'],
    ['Quasi-Peak L1', 'QP'],
    ['quasi peak', 'QP'],
    ['PK_N', 'PK'],
    ['Max Peak', 'PK'],
    ['AVG', 'AV'],
    ['CISPR-Average', 'AV'],
    ['Average', 'AV'],
    ['PK and AV', undefined],
    ['Level', undefined],
    ['Wave', undefined],
  ])('%s speaks of the detector %s', (name, detector) => {
    expect(detectorIn(name)).toBe(detector);
  });

  it.each([
    ['QP L', 'L'],
    ['QP_N', 'N'],
    ['qp-n', 'N'],
    ['Phase L1', 'L1'],
    ['L2 (AV)', 'L2'],
    ['PK +', '+'],
    ['supply -', '-'],
    ['L and N', undefined],
    ['Quasi-Peak', undefined],
    ['Level', undefined],
  ])('%s speaks of the line %s', (name, line) => {
    expect(lineIn(name)).toBe(line);
  });
});
