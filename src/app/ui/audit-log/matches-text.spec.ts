import type { AuditEntryView } from '@shared/contracts/audit';
import { matchesText } from './matches-text';

const ENTRY: AuditEntryView = {
  id: 1,
  at: '2026-11-06T14:47:25.424Z',
  actor: 'Runa Fellgarth',
  actorKind: 'person',
  action: 'reference.chosen',
  subjectKind: 'product',
  subjectId: '2',
  summary: 'Reference of adapter-45 is A3 / 1.0.0: Release.',
  details: { before: 22, now: { reason: 'the unit at the test house' } },
};

it.each([
  ['', true],
  ['runa', true],
  ['RUNA reference', true],
  ['test house', true],
  ['runa token', false],
])('finds "%s": %s', (text, isFound) => {
  expect(matchesText(ENTRY, text)).toBe(isFound);
});
