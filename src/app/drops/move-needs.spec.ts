import { moveFault } from '../../../server/drops/drop-policy';
import { DROP_STATES } from '@shared/contracts/drop-states';
import { moveNeeds, type MoveTarget } from './move-needs';

const TARGETS: MoveTarget[] = ['checking', 'causeKnown', 'fixed', 'accepted'];

it('asks for exactly what the server would refuse a move without', () => {
  for (const from of DROP_STATES) {
    for (const to of TARGETS) {
      const complete = { state: to, note: 'because', fixedByBuildId: 18 };
      if (moveFault(from, complete) !== null) continue;
      const { note, build } = moveNeeds(from, to);
      expect([from, to, moveFault(from, { ...complete, note: '' }) !== null]).toEqual([from, to, note]);
      const withoutBuild = { state: to, note: 'because' };
      expect([from, to, moveFault(from, withoutBuild) !== null]).toEqual([from, to, build]);
    }
  }
});
