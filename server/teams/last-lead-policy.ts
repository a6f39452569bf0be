import { ServiceError } from '../service-error';

/** @throws ServiceError `conflict` when a team that had a lead has none left, for nobody in it could mend that */
export function requireLeadLeft(team: { key: string }, leads: number): void {
  if (leads === 0)
    throw new ServiceError('conflict', `this is the last lead of ${team.key}; make another member a lead first`);
}
