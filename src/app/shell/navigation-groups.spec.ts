import { leastRole } from '@shared/access/permissions';
import { isAtLeast, type Role } from '@shared/access/roles';
import { navigationGroups } from './navigation-groups';

function pages(role: Role, given: { isAdministrator?: boolean; hasMailbox?: boolean } = {}): string[] {
  const groups = navigationGroups({
    teamKey: 'charging',
    may: (action) => isAtLeast(role, leastRole(action)),
    isAdministrator: false,
    hasMailbox: false,
    ...given,
  });
  return groups.flatMap(({ items }) => items.map(({ label }) => label));
}

describe('the side navigation', () => {
  it('leaves out what a viewer may not open', () => {
    expect(pages('viewer')).toEqual([
      'Overview',
      'Drops',
      'Sweeps',
      'Benches',
      'Limits',
      'Members',
      'Digest',
      'Job runs',
      'API',
    ]);
  });

  it('offers the import to technicians, tokens and audit to leads', () => {
    expect(pages('technician')).toContain('Import');
    expect(pages('technician')).not.toContain('Audit');
    expect(pages('lead')).toEqual(expect.arrayContaining(['Tokens', 'Audit']));
  });

  it('shows the installation to administrators and the mailbox in the demo', () => {
    expect(pages('viewer', { isAdministrator: true, hasMailbox: true })).toEqual(
      expect.arrayContaining(['Teams', 'People', 'Mailbox']),
    );
  });

  it('links into the team of the address', () => {
    const [work] = navigationGroups({ teamKey: 'drives', may: () => true, isAdministrator: false, hasMailbox: false });
    expect(work.items.map(({ path }) => path)).toContain('/t/drives/drops');
  });
});
