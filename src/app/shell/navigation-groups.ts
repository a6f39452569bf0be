import type { Action } from '@shared/access/permissions';
import type { IconName } from '../ui/icons';

export interface NavigationItem {
  label: string;
  icon: IconName;
  /** Path of a page of the client, or of a page the server draws itself (`isServerPage`). */
  path: string;
  isServerPage?: boolean;
}

export interface NavigationGroup {
  /** Empty for the first group, which needs no heading. */
  label: string;
  items: readonly NavigationItem[];
}

export interface NavigationContext {
  teamKey: string | undefined;
  may: (action: Action) => boolean;
  isAdministrator: boolean;
  hasMailbox: boolean;
}

/** What stands in the side navigation for this person in this team; pages they may not open are left out. */
export function navigationGroups({ teamKey, may, isAdministrator, hasMailbox }: NavigationContext): NavigationGroup[] {
  const groups: NavigationGroup[] = [];
  if (teamKey !== undefined) groups.push(...teamGroups(`/t/${teamKey}`, may));
  if (isAdministrator) {
    groups.push({
      label: 'Installation',
      items: [
        { label: 'Teams', icon: 'team', path: '/installation/teams' },
        { label: 'People', icon: 'people', path: '/installation/people' },
      ],
    });
  }
  const help: NavigationItem[] = [{ label: 'API', icon: 'api', path: '/api/docs', isServerPage: true }];
  if (hasMailbox) help.push({ label: 'Mailbox', icon: 'mail', path: '/mailbox' });
  groups.push({ label: 'Help', items: help });
  return groups;
}

function teamGroups(team: string, may: (action: Action) => boolean): NavigationGroup[] {
  const work: NavigationItem[] = [
    { label: 'Overview', icon: 'overview', path: `${team}/overview` },
    { label: 'Drops', icon: 'drop', path: `${team}/drops` },
    { label: 'Sweeps', icon: 'sweep', path: `${team}/sweeps` },
  ];
  if (may('sweeps.add')) work.push({ label: 'Import', icon: 'import', path: `${team}/import` });
  work.push(
    { label: 'Benches', icon: 'bench', path: `${team}/benches` },
    { label: 'Limits', icon: 'limit', path: `${team}/limits` },
  );
  const settings: NavigationItem[] = [{ label: 'Members', icon: 'members', path: `${team}/members` }];
  if (may('tokens.manage')) settings.push({ label: 'Tokens', icon: 'key', path: `${team}/tokens` });
  settings.push({ label: 'Digest', icon: 'digest', path: `${team}/digest` });
  if (may('audit.read')) settings.push({ label: 'Audit', icon: 'audit', path: `${team}/audit` });
  settings.push({ label: 'Job runs', icon: 'jobs', path: `${team}/jobs` });
  return [
    { label: '', items: work },
    { label: 'Team', items: settings },
  ];
}
