import { adapterProduct } from './scenario-adapter';
import { chargerProduct } from './scenario-charger';
import { driveProduct } from './scenario-drive';
import { lampProduct } from './scenario-lamp';
import { serverProduct } from './scenario-server';
import type { DemoBench, DemoPerson, DemoScenario, DemoTeam } from './scenario-types';

/**
 * The demo's invented company with everything it has measured so far.
 *
 * @param nowMs the demo's now, UTC ms: the newest builds end a few days before it
 * @returns the scenario; levels do not depend on nowMs, only dates do
 */
export function demoScenario(nowMs: number): DemoScenario {
  return {
    company: 'Brackenholt Power Works',
    teams: TEAMS,
    people: PEOPLE,
    benches: BENCHES,
    products: [chargerProduct, adapterProduct, serverProduct, driveProduct, lampProduct].map((product) =>
      product(nowMs),
    ),
  };
}

const TEAMS: DemoTeam[] = [
  { key: 'charging', name: 'Charging', timeZone: 'Europe/Stockholm', targetMarginDb: 3 },
  { key: 'server-power', name: 'Server power', timeZone: 'America/Chicago', targetMarginDb: 6 },
  { key: 'drives-lighting', name: 'Drives and lighting', timeZone: 'Asia/Tokyo', targetMarginDb: 3 },
];

const PEOPLE: DemoPerson[] = [
  person('Orla Tenby', true, []),
  person('Runa Fellgarth', false, [['charging', 'lead']]),
  person('Ivo Brasted', false, [['charging', 'engineer']]),
  person('Tamsin Orrow', false, [['charging', 'technician']]),
  person('Jonah Wexcombe', false, [['charging', 'viewer']]),
  person('Delphine Arkwold', false, [
    ['server-power', 'lead'],
    ['charging', 'viewer'],
  ]),
  person('Caspar Lindreth', false, [['server-power', 'engineer']]),
  person('Mabli Thornacre', false, [['server-power', 'technician']]),
  person('Soren Quillby', false, [['server-power', 'viewer']]),
  person('Hanae Morwick', false, [['drives-lighting', 'lead']]),
  person('Edric Salloway', false, [['drives-lighting', 'engineer']]),
  person('Noor Ashgrove', false, [['drives-lighting', 'technician']]),
  person('Pell Hathersby', false, [['drives-lighting', 'viewer']]),
];

function person(
  name: string,
  isAdministrator: boolean,
  roles: [teamKey: string, role: DemoPerson['memberships'][number]['role']][],
): DemoPerson {
  return {
    name,
    email: `${name.toLowerCase().replace(' ', '.')}@brackenholt.example`,
    isAdministrator,
    memberships: roles.map(([teamKey, role]) => ({ teamKey, role })),
  };
}

const BENCHES: DemoBench[] = [
  {
    key: 'bench-1',
    name: 'Bench 1, screened room',
    location: 'Building 2, ground floor',
    lisn: '50 uH / 50 ohm two-line network with built-in 10 dB pad',
    receiver: 'EMI receiver with parallel CISPR detectors',
    notes: '',
    teamKeys: ['charging', 'server-power', 'drives-lighting'],
    noiseFigureDb: 16,
    attenuationDb: 10,
    padDb: 10,
    ambient: [
      { frequencyHz: 693_000, levelDbuv: 9 },
      { frequencyHz: 1_053_000, levelDbuv: 11 },
    ],
  },
  {
    key: 'bench-2',
    name: 'Bench 2, open laboratory',
    location: 'Building 5, first floor',
    lisn: '50 uH / 50 ohm two-line network with external 10 dB pad',
    receiver: 'Spectrum analyser with CISPR option',
    notes: 'No screened room: broadcast pick-up between 0.5 and 1.6 MHz.',
    teamKeys: ['charging', 'server-power', 'drives-lighting'],
    noiseFigureDb: 20,
    attenuationDb: 10,
    padDb: 10,
    ambient: [
      { frequencyHz: 549_000, levelDbuv: 20 },
      { frequencyHz: 693_000, levelDbuv: 24 },
      { frequencyHz: 810_000, levelDbuv: 17 },
      { frequencyHz: 1_053_000, levelDbuv: 26 },
      { frequencyHz: 1_242_000, levelDbuv: 18 },
      { frequencyHz: 1_413_000, levelDbuv: 21 },
    ],
  },
];
