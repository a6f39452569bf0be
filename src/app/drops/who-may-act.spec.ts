import type { DropView } from '@shared/contracts/drops';
import { whyNoMoves } from './who-may-act';

const OPEN: Pick<DropView, 'moves' | 'state' | 'team'> = { moves: ['checking'], state: 'new', team: 'charging' };
const ENGINEER = { team: 'charging', teamName: 'Charging', role: 'engineer', mayTriage: true } as const;

it('lets an engineer of the team act', () => {
  expect(whyNoMoves(OPEN, ENGINEER)).toBeNull();
});

it.each(['viewer', 'technician'] as const)('tells a %s who acts', (role) => {
  const words = whyNoMoves({ ...OPEN, moves: [] }, { ...ENGINEER, role, mayTriage: false });
  expect(words).toBe(`You read Charging as ${role}. Its engineers and leads move drops and give them an owner.`);
});

it('tells a lead of another team that the product is only shared', () => {
  const words = whyNoMoves({ ...OPEN, moves: [] }, { ...ENGINEER, team: 'drives', role: 'lead' });
  expect(words).toContain('another team');
});

it('says that a withdrawn drop needs nobody', () => {
  expect(whyNoMoves({ ...OPEN, moves: [], state: 'withdrawn' }, ENGINEER)).toContain('no longer support');
});
