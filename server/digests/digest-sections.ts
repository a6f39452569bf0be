import { DROP_STATE_WORDS } from '@shared/contracts/drops';
import { formatDecibels, formatSignedDecibels } from '@shared/units/format-decibels';
import type { DigestFacts } from './digest-facts';
import type { DigestDrop } from './digest-drops';

export interface DigestSection {
  heading: string;
  /** One a line; `path` leads to the page that tells more. */
  items: { text: string; path?: string }[];
  /** What stands there when there is no item. */
  none: string;
}

/** The sections after the five lines: drops, gains, creep, what is not measured. */
export function digestSections(facts: DigestFacts): DigestSection[] {
  return [
    { heading: 'New drops', items: facts.drops.newOnes.map((drop) => dropItem(facts, drop)), none: 'Nothing dropped.' },
    { heading: 'Open from before', items: facts.drops.older.map((drop) => dropItem(facts, drop)), none: 'None.' },
    {
      heading: 'Gains',
      items: [...gainItems(facts), ...facts.drops.ended.map((drop) => dropItem(facts, drop))],
      none: 'None.',
    },
    { heading: 'Creep', items: creepItems(facts), none: 'No slow loss is seen.' },
    {
      heading: 'Not measured',
      items: unmeasuredItems(facts),
      none: 'Every required state of every newest build is measured.',
    },
  ];
}

function dropItem({ teamKey }: DigestFacts, drop: DigestDrop): DigestSection['items'][number] {
  const owner = drop.owner === null ? 'nobody has taken it' : `with ${drop.owner}`;
  return {
    text: `${drop.product}: ${drop.sentence} (${[drop.now, DROP_STATE_WORDS[drop.state], owner].filter((part) => part !== null).join(', ')})`,
    path: `/t/${teamKey}/drops/${drop.id}`,
  };
}

/** One line a build: its largest gain stands for the others. */
function gainItems({ gains }: DigestFacts): DigestSection['items'] {
  const largest = new Map<string, (typeof gains)[number]>();
  for (const gain of gains) {
    const build = `${gain.product} ${gain.hardware} / ${gain.firmware}`;
    if ((gain.differenceDb ?? 0) > (largest.get(build)?.differenceDb ?? 0)) largest.set(build, gain);
  }
  return [...largest].map(([build, { differenceDb, marginDb, state, band }]) => ({
    text: `${build}: ${formatSignedDecibels(differenceDb ?? 0)} in ${band} (${state})${marginDb === null ? '' : `, ${formatDecibels(marginDb)} margin now`}`,
  }));
}

function creepItems({ creep }: DigestFacts): DigestSection['items'] {
  return creep.map(({ product, state, band, marginDb, creep: { slopeDbPerBuild, buildsToTarget } }) => {
    const ahead =
      buildsToTarget === null
        ? ''
        : buildsToTarget === 0
          ? ', at the target margin already'
          : `, the target margin in about ${buildsToTarget} builds`;
    return {
      text: `${product}: ${slopeDbPerBuild.toFixed(2)} dB a build in ${band} (${state}), ${formatDecibels(marginDb)} left${ahead}`,
    };
  });
}

function unmeasuredItems({ products, teamKey }: DigestFacts): DigestSection['items'] {
  return products
    .filter(({ unmeasuredStates }) => unmeasuredStates.length > 0)
    .map(({ key, name, latestBuild, unmeasuredStates }) => ({
      text: `${name} ${latestBuild === null ? '' : `${latestBuild.hardware} / ${latestBuild.firmware}`}: ${unmeasuredStates.join(', ')}`,
      path: `/t/${teamKey}/products/${key}`,
    }));
}
