import { dropView, sighting, witness } from '../../../test/builders/drop-builder';
import { fiveAnswers, QUESTIONS } from './five-answers';

const answer = (id: string, drop = dropView()) => fiveAnswers(drop).find((one) => one.id === id);

it('answers the five questions in the order people ask them', () => {
  expect(fiveAnswers(dropView()).map(({ question }) => question)).toEqual([
    'Is it real?',
    'Where?',
    'How much is left?',
    'What changed?',
    'Who acts?',
  ]);
  expect(QUESTIONS).toHaveLength(5);
});

it('puts the figures of the verdict and what they rest on under "Is it real?"', () => {
  expect(answer('real')).toMatchObject({
    short: '6.5 dB lost, chance of it by spread alone below 0.0001',
    more: '3 runs against 3, set-up alike',
  });
});

it('warns of a single run and names what differs in the set-up', () => {
  const drop = dropView({
    evidence: {
      witnesses: [witness({ buildRuns: 1, singleRun: true })],
      setUp: [
        { what: 'Bench', build: 'bench-2', reference: 'bench-1', isDifferent: true },
        { what: 'RBW', build: '9 kHz', reference: '9 kHz', isDifferent: false },
      ],
    },
  });
  expect(answer('real', drop)?.more).toBe('Rests on a single run, set-up differs: Bench');
});

it('says that no harmonic fits instead of leaving the place empty', () => {
  expect(answer('where')?.more).toBe('PFC n=2, 230 V full load');
  expect(answer('where', dropView({ evidence: { harmonic: null } }))?.more).toContain('No single harmonic fits');
});

it('puts a switching frequency before the names of revisions', () => {
  expect(answer('changed')).toMatchObject({
    short: 'PFC switching frequency 65 kHz to 78 kHz',
    more: 'Also: Firmware',
  });
  expect(answer('changed', dropView({ evidence: { changes: [] } }))?.short).toBe('Nothing was declared');
});

it('compares the margin before rounding', () => {
  const left = (marginDb: number) => answer('left', dropView({ latest: sighting({ marginDb }) }))?.short;
  expect([left(-2.5), left(-0.02), left(0.02), left(1.42)]).toEqual([
    '2.5 dB over the limit',
    'Just over the limit',
    '0.0 dB left',
    '1.4 dB left',
  ]);
  expect(answer('left', dropView({ latest: sighting({ marginDb: 1 }) }))?.more).toBe(
    '2.0 dB short of the target of 3.0 dB',
  );
});

it('says what is left in the newest build that shows the loss, and where the margin is back', () => {
  const later = sighting({ buildId: 18, firmware: '4.2.0', marginDb: 1.9 });
  expect(answer('left', dropView({ latest: later }))?.short).toBe('1.9 dB left in C2 / 4.2.0');
  const back = dropView({ noLongerSeenIn: { id: 19, hardware: 'C3', firmware: '4.2.1' } });
  expect(answer('left', back)).toMatchObject({
    short: 'The margin is back in C3 / 4.2.1',
    more: '2.5 dB over the limit in C2 / 4.1.0',
  });
});

it('names the owner and the build that shows a fix', () => {
  const fixed = dropView({
    state: 'fixed',
    owner: { id: 3, name: 'Ivo Brasted' },
    fixedBy: { id: 18, hardware: 'C3', firmware: '4.1.1' },
  });
  expect(answer('acts', fixed)).toMatchObject({ short: 'Ivo Brasted', more: 'Fixed, shown by C3 / 4.1.1' });
});
