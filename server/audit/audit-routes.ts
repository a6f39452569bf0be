import { AuditQuery } from '@shared/contracts/audit';
import { Router } from 'express';
import type { Context } from '../context';
import { personOf } from '../http/actor-of';
import { pathText } from '../http/route-parameters';
import { requireAdministrator } from '../require-permission';
import { findTeam } from '../teams/find-team';
import { listAudit } from './list-audit';

/** The audit log. */
export function auditRoutes(context: Context): Router {
  return Router()
    .get('/teams/:team/audit', (request, response) => {
      const team = findTeam(context, personOf(request), pathText(request, 'team'), 'audit.read');
      response.json(listAudit(context, team.id, AuditQuery.parse(request.query)));
    })
    .get('/installation/audit', (request, response) => {
      requireAdministrator(personOf(request));
      response.json(listAudit(context, null, AuditQuery.parse(request.query)));
    });
}
