import { belongsTo, may, type Subject } from './may';
import { type Action, PERMISSIONS } from './permissions';
import { isAtLeast, type Role, ROLES } from './roles';

const person = (role: Role): Subject => ({ kind: 'person', roles: new Map([[1, role]]) });
const actions = Object.keys(PERMISSIONS) as Action[];

describe('permissions', () => {
  it.each(ROLES)('gives a %s what the table says and nothing more', (role) => {
    for (const action of actions) expect(may(person(role), action, 1)).toBe(isAtLeast(role, PERMISSIONS[action].role));
  });

  it('gives nobody anything in a team they are not in', () => {
    for (const action of actions) {
      expect(may(person('lead'), action, 2)).toBe(false);
      expect(may({ kind: 'token', teamId: 1, scopes: ['sweeps:write', 'results:read', 'gate:read'] }, action, 2)).toBe(
        false,
      );
    }
    expect(belongsTo(person('lead'), 2)).toBe(false);
  });

  it('lets a token act only within its scopes', () => {
    const token: Subject = { kind: 'token', teamId: 1, scopes: ['sweeps:write'] };
    expect(may(token, 'sweeps.add', 1)).toBe(true);
    expect(may(token, 'results.read', 1)).toBe(false);
    expect(may(token, 'drops.triage', 1)).toBe(false);
  });

  it('keeps triage from a technician and reference choice from an engineer', () => {
    expect(may(person('technician'), 'drops.triage', 1)).toBe(false);
    expect(may(person('engineer'), 'drops.triage', 1)).toBe(true);
    expect(may(person('engineer'), 'references.choose', 1)).toBe(false);
  });
});
