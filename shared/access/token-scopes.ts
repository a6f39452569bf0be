/** What a team token may be made for; a token does nothing outside its scopes. */
export const TOKEN_SCOPES = ['sweeps:write', 'results:read', 'gate:read'] as const;

export type TokenScope = (typeof TOKEN_SCOPES)[number];
