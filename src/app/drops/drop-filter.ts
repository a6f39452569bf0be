import { DROP_STATES } from '@shared/contracts/drop-states';

/** What the address of the list asks for; whatever it does not understand counts as left out. */
export interface DropFilter {
  /** `open`, `all`, or states with commas between. */
  state: string;
  /** Key of a product; null: every product of the team. */
  product: string | null;
  /** `me`, `nobody` or a person's number; null: whoever owns it. */
  owner: string | null;
}

export function readDropFilter(query: { state?: string; product?: string; owner?: string }): DropFilter {
  const { state = 'open', product, owner } = query;
  const isKnown = state.split(',').every((one) => DROP_STATES.some((known) => known === one));
  return {
    state: state === 'all' || isKnown ? state : 'open',
    product: product ? product : null,
    owner: owner !== undefined && /^(me|nobody|[1-9]\d*)$/.test(owner) ? owner : null,
  };
}

/** The request behind the list: the team's drops, or those of one product, which may be another team's. */
export function dropsRequest(team: string, { state, product, owner }: DropFilter, productOwner = team) {
  const params: Record<string, string> = {};
  if (state !== 'all') params['state'] = state;
  if (owner !== null) params['owner'] = owner;
  if (product === null) return { url: `/api/teams/${encodeURIComponent(team)}/drops`, params };
  const url = `/api/v1/products/${encodeURIComponent(product)}/drops`;
  return { url, params: { ...params, team: productOwner } };
}

/** The address of the same list with another choice; what is the default stays out of it. */
export function dropFilterQuery({ state, product, owner }: DropFilter) {
  return { state: state === 'open' ? null : state, product, owner };
}
