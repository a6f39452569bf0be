import { dropFilterQuery, dropsRequest, readDropFilter } from './drop-filter';

describe('the filter in the address', () => {
  it('shows the open drops of every product and owner when nothing is asked', () => {
    expect(readDropFilter({})).toEqual({ state: 'open', product: null, owner: null });
  });

  it.each(['open', 'all', 'new', 'fixed,accepted'])('takes %s for a state', (state) => {
    expect(readDropFilter({ state }).state).toBe(state);
  });

  it('falls back to the open drops on a state or an owner nobody knows', () => {
    expect(readDropFilter({ state: 'new,lost', owner: 'everyone' })).toMatchObject({ state: 'open', owner: null });
  });

  it.each([{}, { state: 'all', owner: 'me' }, { state: 'fixed', product: 'charger-750', owner: '12' }])(
    'comes back the same from the address it writes: %j',
    (query) => {
      const filter = readDropFilter(query);
      const written = Object.entries(dropFilterQuery(filter)).filter(([, value]) => value !== null);
      expect(readDropFilter(Object.fromEntries(written) as typeof query)).toEqual(filter);
    },
  );
});

describe('the request of the list', () => {
  it('asks the team for its drops', () => {
    expect(dropsRequest('charging', readDropFilter({ owner: 'me' }))).toEqual({
      url: '/api/teams/charging/drops',
      params: { state: 'open', owner: 'me' },
    });
  });

  it('asks for the drops of one product, of the team that owns it', () => {
    const filter = readDropFilter({ state: 'all', product: 'psu-240' });
    expect(dropsRequest('charging', filter, 'server-power')).toEqual({
      url: '/api/v1/products/psu-240/drops',
      params: { team: 'server-power' },
    });
  });
});
