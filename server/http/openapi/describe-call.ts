import type { RouteConfig } from '@asteasolutions/zod-to-openapi';
import { type Permission, PERMISSIONS } from '@shared/access/permissions';
import { Problem, type ProblemCode } from '@shared/contracts/problem';
import * as z from 'zod';
import { PROBLEM_STATUS } from '../problem-status';
import type { ApiCall, Content } from './api-call';

/** The call as the generator takes it; permissions and problems come from the tables the server itself goes by. */
export function describeCall(call: ApiCall): RouteConfig {
  const { method, path, tag, summary, query, body } = call;
  return {
    method,
    path: `/api/v1${path}`,
    tags: [tag],
    summary,
    description: [call.description, whoMay(call)].filter(Boolean).join('\n\n'),
    security: securityOf(call),
    request: {
      params: pathParameters(path),
      ...(query && { query }),
      ...(body && { body: { required: true, content: contentOf(body) } }),
    },
    responses: {
      ...Object.fromEntries(
        Object.entries(call.answers).map(([status, { description, content }]) => [
          status,
          { description, ...(content && { content: contentOf(content) }) },
        ]),
      ),
      ...problemsOf(call),
    },
  };
}

function permissionOf({ action }: ApiCall): Permission | undefined {
  return action && PERMISSIONS[action];
}

function whoMay(call: ApiCall): string {
  const permission = permissionOf(call);
  if (permission === undefined) return 'For everybody signed in and for every team token.';
  const token = permission.scope ? ` or a token with the scope \`${permission.scope}\`` : '; not for tokens';
  return `Needs the role ${permission.role} in the team${token}.`;
}

function securityOf(call: ApiCall): Record<string, string[]>[] {
  const permission = permissionOf(call);
  const session: Record<string, string[]> = call.method === 'get' ? { session: [] } : { session: [], crossSite: [] };
  if (permission === undefined) return [{ token: [] }, session];
  return permission.scope ? [{ token: [permission.scope] }, session] : [session];
}

function pathParameters(path: string): z.ZodObject {
  const names = [...path.matchAll(/\{(\w+)\}/g)].map(([, name = '']) => name);
  return z.object(Object.fromEntries(names.map((name) => [name, /^id$|Id$/.test(name) ? z.int() : z.string()])));
}

function contentOf(content: Content) {
  return Object.fromEntries(Object.entries(content).map(([type, schema]) => [type, { schema }]));
}

/** Problems by status; two codes may share one. */
function problemsOf({ path, query, body, problems = [] }: ApiCall): RouteConfig['responses'] {
  const codes: ProblemCode[] = ['signedOut', 'forbidden', ...problems];
  if (path.includes('{') || query !== undefined) codes.push('notFound');
  if (body !== undefined || query !== undefined) codes.push('invalid');
  const responses: RouteConfig['responses'] = {};
  for (const code of codes) {
    const { status, title } = PROBLEM_STATUS[code];
    const sameStatus = codes.filter((other) => PROBLEM_STATUS[other].status === status);
    responses[status] = {
      description: `${title}: \`type\` is ${sameStatus.map((other) => `/problems/${other}`).join(' or ')}`,
      content: { 'application/problem+json': { schema: Problem } },
    };
  }
  return responses;
}
