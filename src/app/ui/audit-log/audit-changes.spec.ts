import { auditChanges } from './audit-changes';

describe('the old and new values of an audit entry', () => {
  it('stand side by side, those that stayed the same left out', () => {
    expect(
      auditChanges({
        before: { isAdministrator: false, isDisabled: false },
        now: { isAdministrator: true, isDisabled: false },
      }),
    ).toEqual([{ what: 'isAdministrator', before: 'no', now: 'yes' }]);
  });

  it('leave out old values the change did not name', () => {
    expect(auditChanges({ before: { weekday: 1, hour: 7 }, now: { hour: 9 } })).toEqual([
      { what: 'hour', before: '7', now: '9' },
    ]);
  });

  it.each([
    [{ before: { role: 'viewer' }, now: null }, [{ what: 'role', before: 'viewer', now: '' }]],
    [
      { now: { name: 'bench', scopes: ['a', 'b'] } },
      [
        { what: 'name', before: '', now: 'bench' },
        { what: 'scopes', before: '', now: 'a, b' },
      ],
    ],
    [{ before: 22, now: 28 }, [{ what: 'value', before: '22', now: '28' }]],
    [{ before: null, now: 3 }, [{ what: 'value', before: '', now: '3' }]],
    [{}, []],
  ])('are read from %j', (details, changes) => {
    expect(auditChanges(details)).toEqual(changes);
  });
});
