import type { AuditEntryView } from '@shared/contracts/audit';
import { referenceChoices } from './reference-choices';

const builds = [
  { id: 11, hardware: 'C2', firmware: '3.6.2' },
  { id: 16, hardware: 'C2', firmware: '4.1.0' },
];

function entry(id: number, summary: string, details: Record<string, unknown>): AuditEntryView {
  return {
    id,
    at: '2026-10-04T14:44:14.220Z',
    actor: 'Runa Fellgarth',
    actorKind: 'person',
    action: 'reference.chosen',
    subjectKind: 'product',
    subjectId: '1',
    summary,
    details,
  };
}

describe('choices of the reference in the audit log', () => {
  it('keeps those of the product, with the build and the reason', () => {
    const choices = referenceChoices(
      [
        entry(3, 'Reference of charger-750 is the pooled mean of builds judged held: Going: on.', {
          before: 11,
          now: null,
        }),
        entry(2, 'Reference of charger-750 is C2 / 3.6.2: Test house: release.', { before: null, now: 11 }),
        entry(1, 'Reference of adapter-45 is A3 / 1.0.0: Release.', { before: null, now: 28 }),
        { ...entry(0, 'Build 11 was changed', { now: 11 }), action: 'build.changed' },
      ],
      builds,
    );
    expect(choices.map(({ id, what, reason }) => [id, what, reason])).toEqual([
      [3, 'builds judged held', 'Going: on.'],
      [2, 'C2 / 3.6.2', 'Test house: release.'],
    ]);
  });
});
