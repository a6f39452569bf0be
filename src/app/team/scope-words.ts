import type { TokenScope } from '@shared/access/token-scopes';

/** What a scope lets a bench or a pipeline do. */
export const SCOPE_WORDS: Record<TokenScope, string> = {
  'sweeps:write': 'add sweeps and have them judged',
  'results:read': 'read builds, verdicts, drops, trend and margin map',
  'gate:read': 'ask the gate whether a build may go on',
};
