import { TestBed } from '@angular/core/testing';
import type { TeamView } from '@shared/contracts/teams';
import { fillTeamSettings, teamPatch, teamSettingsForm } from './team-settings-form';

const TEAM: TeamView = {
  key: 'charging',
  name: 'Charging',
  timeZone: 'Europe/Stockholm',
  targetMarginDb: 3,
  thresholdDb: 2,
  bands: [{ name: 'AM broadcast', fromHz: 526_500, toHz: 1_606_500 }],
  isArchived: false,
};

function filled() {
  const settings = TestBed.runInInjectionContext(teamSettingsForm);
  fillTeamSettings(settings, TEAM);
  return settings;
}

it('changes nothing when nothing was changed, bands in MHz and back included', () => {
  const settings = filled();
  expect(settings.form.valid).toBe(true);
  expect(settings.form.controls.bands.getRawValue()).toEqual([
    { name: 'AM broadcast', fromMhz: 0.5265, toMhz: 1.6065 },
  ]);
  expect(teamPatch(settings, TEAM)).toEqual({});
});

it('sends only what was changed, frequencies as whole Hz', () => {
  const settings = filled();
  settings.form.controls.thresholdDb.setValue(1.5);
  settings.form.controls.bands.push(settings.band(' Long wave ', 0.15, 0.2835));
  expect(teamPatch(settings, TEAM)).toEqual({
    thresholdDb: 1.5,
    bands: [...TEAM.bands, { name: 'Long wave', fromHz: 150_000, toHz: 283_500 }],
  });
});

it.each([
  [0.1, 1, 'fromMhz'],
  [1, 31, 'toMhz'],
])('does not take a band from %d to %d MHz', (fromMhz, toMhz, field) => {
  const band = filled().band('x', fromMhz, toMhz);
  expect(band.get(field)?.valid).toBe(false);
});

it('does not take a band that ends where it starts', () => {
  expect(filled().band('x', 5, 5).errors).toEqual({ order: 'a band must end above its start' });
});
