import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting, TestRequest } from '@angular/common/http/testing';
import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import { provideRouter, Router } from '@angular/router';
import type { ImportPlan, ReadingView } from '@shared/contracts/imports';
import { aReading } from '../../../test/builders/draft-builder';
import { CurrentTeam } from '../session/current-team';
import { CHART_ENGINE } from '../ui/chart/chart-engine';
import { ImportPage } from './import-page';

const products = [{ key: 'psu-240', name: 'PSU', isShared: false, limitSetKey: 'CISPR32_B' }];
const benches = [{ key: 'bench-1', name: 'Bench 1', isArchived: false }];
const product = { key: 'psu-240', limitSetKey: 'CISPR32_B', states: [{ name: '230 V full load' }], units: ['0007'] };
const aProblem = {
  type: '/problems/unreadable',
  title: 'The file cannot be read',
  status: 422,
  detail: 'Line 3, column 2: found "overload", expected a number.',
  line: 3,
  column: 2,
  found: '"overload"',
  expected: 'a number',
};

function answerLookUps(http: HttpTestingController): void {
  const answers: [string, unknown][] = [
    ['/api/v1/products?team=power', products],
    ['/api/teams/power/benches', benches],
    ['/api/v1/products/psu-240?team=power', product],
    ['/api/v1/products/psu-240/builds?team=power', []],
    ['/api/teams/power/imports', []],
  ];
  for (const [url, body] of answers) {
    for (const request of http.match({ method: 'GET', url })) if (!request.cancelled) request.flush(body as object);
  }
}

async function open(mayAdd = true) {
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter([]),
      { provide: CHART_ENGINE, useValue: () => new Promise<never>(() => undefined) },
      {
        provide: CurrentTeam,
        useValue: { may: () => mayAdd, timeZone: signal('UTC'), targetMarginDb: signal(6) },
      },
    ],
  });
  const fixture = TestBed.createComponent(ImportPage);
  fixture.componentRef.setInput('team', 'power');
  const http = TestBed.inject(HttpTestingController);
  const element = fixture.nativeElement as HTMLElement;
  // Each answer may make the page ask for more.
  const settle = async () => {
    for (let round = 0; round < 4; round++) {
      fixture.detectChanges();
      answerLookUps(http);
      await Promise.resolve();
    }
    fixture.detectChanges();
  };
  await settle();

  const drop = async (...names: string[]): Promise<TestRequest[]> => {
    const event = new Event('drop', { bubbles: true });
    const files = names.map((name) => new File(['f,level\n1,2\n1,overload\n'], name));
    Object.assign(event, { dataTransfer: { files, types: ['Files'] } });
    element.querySelector('app-file-drop')?.dispatchEvent(event);
    await settle();
    return http.match(({ url, responseType }) => url.endsWith('/readings') && responseType === 'json');
  };
  const type = async (field: string, text: string) => {
    const input = element.querySelector<HTMLInputElement>(`app-suggest-field:nth-of-type(${field}) input`);
    if (!input) throw new Error(`no field ${field}`);
    input.value = text;
    input.dispatchEvent(new Event('input'));
    await settle();
  };
  const typeBuild = async () => {
    await type('1', 'C1');
    await type('2', '2.4.1');
    await type('3', '230 V full load');
  };
  const save = async () => {
    const button = element.querySelector<HTMLButtonElement>('app-save-bar button');
    button?.click();
    await settle();
  };
  return { fixture, http, element, settle, drop, typeBuild, save };
}

const twoTraces: ReadingView = aReading([
  { name: 'L QP', line: 'L', detector: 'QP' },
  { name: 'N QP', line: 'N', detector: 'QP' },
]);

describe('ImportPage', () => {
  it('reads every dropped file and says what still is needed', async () => {
    const { element, settle, drop } = await open();
    const [first] = await drop('a.csv');
    first.flush(twoTraces);
    await settle();
    expect(element.textContent).toContain('2 traces, 6,634 points, 150 kHz to 30 MHz');
    expect(element.querySelector('app-save-bar')?.textContent).toContain(
      'Still needed: hardware revision; firmware revision; operating state',
    );
  });

  it('sends nothing while something is missing, and marks it', async () => {
    const { element, settle, drop, save, http } = await open();
    const [first] = await drop('a.csv');
    first.flush(twoTraces);
    await settle();
    await save();
    http.expectNone('/api/teams/power/imports');
    expect(element.querySelectorAll('app-tags-panel mat-error')).toHaveLength(3);
  });

  it('shows where a file cannot be read, leaves it out, and takes the others', async () => {
    const { element, settle, drop, typeBuild, save, http } = await open();
    const navigate = jest.spyOn(TestBed.inject(Router), 'navigate').mockResolvedValue(true);
    const [bad, good] = await drop('bad.csv', 'good.csv');
    bad.flush(aProblem, { status: 422, statusText: 'Unprocessable' });
    good.flush(twoTraces);
    await settle();
    expect(element.querySelector('app-reading-problem')?.textContent).toContain('Line 3, column 2');
    await typeBuild();
    await save();

    const request = http.expectOne({ method: 'POST', url: '/api/teams/power/imports' });
    const body = request.request.body as FormData;
    expect(body.getAll('files').map((file) => (file as File).name)).toEqual(['good.csv']);
    const plan = JSON.parse(body.get('plan') as string) as ImportPlan;
    expect(plan.tags).toMatchObject({ product: 'psu-240', bench: 'bench-1', hardware: 'C1', firmware: '2.4.1' });
    expect(plan.items.map(({ file, tags }) => [file, tags.trace, tags.line, tags.detector, tags.state])).toEqual([
      [0, 1, 'L', 'QP', '230 V full load'],
      [0, 2, 'N', 'QP', '230 V full load'],
    ]);
    request.flush({ id: 7 }, { status: 202, statusText: 'Accepted' });
    expect(navigate).toHaveBeenCalledWith(['/t', 'power', 'import', 7]);
  });

  it('keeps files and tags when the server refuses them, and names the trace it means', async () => {
    const { fixture, element, settle, drop, typeBuild, save, http } = await open();
    const [first] = await drop('a.csv');
    first.flush(twoTraces);
    await settle();
    await typeBuild();
    await save();
    const errors = [{ path: 'items.1.tags.state', message: 'is archived' }];
    http
      .expectOne({ method: 'POST', url: '/api/teams/power/imports' })
      .flush(
        { type: '/problems/invalid', title: '', status: 400, detail: 'items.1.tags.state: is archived', errors },
        { status: 400, statusText: 'Bad Request' },
      );
    await settle();
    expect(element.querySelector('app-problem-banner')?.textContent).toContain(
      'a.csv, trace 2, operating state: is archived',
    );
    expect(element.querySelector('app-problem-banner')?.textContent).toContain('Your files and tags are still here');
    expect(element.querySelectorAll('app-file-card')).toHaveLength(1);
    expect(fixture.componentInstance.unsaved()).toContain('One file and its tags are not saved yet');
  });

  it('takes the time in a file for that file and says so, until somebody types one', async () => {
    const { element, settle, drop, typeBuild, save, http } = await open();
    const [first, second] = await drop('a.csv', 'b.csv');
    first.flush({ ...twoTraces, sha256: 'a', takenAt: '2026-03-02T08:20:15.000Z' });
    second.flush({ ...twoTraces, sha256: 'b', takenAt: '2026-03-02T10:00:00.000Z' });
    await settle();
    const field = () => element.querySelector<HTMLInputElement>('app-file-choices input[type=datetime-local]');
    const note = () => element.querySelector('app-file-choices .note')?.textContent;
    expect([field()?.value, note()]).toEqual(['2026-03-02T08:20', 'from the file']);

    const type = async (text: string) => {
      const input = field();
      if (input) input.value = text;
      input?.dispatchEvent(new Event('change'));
      await settle();
    };
    await type('2026-03-02T09:00');
    expect([field()?.value, note()]).toEqual(['2026-03-02T09:00', 'the file says 2026-03-02 08:20']);
    await type('');
    expect([field()?.value, note()]).toEqual(['2026-03-02T08:20', 'from the file']);
    await type('');
    expect(field()?.value).toBe('2026-03-02T08:20');

    await type('2026-03-02T09:00');
    await typeBuild();
    await save();
    const request = http.expectOne({ method: 'POST', url: '/api/teams/power/imports' });
    const { items } = JSON.parse((request.request.body as FormData).get('plan') as string) as ImportPlan;
    expect(items.map(({ tags }) => tags.takenAt)).toEqual([
      '2026-03-02T09:00:00.000Z',
      '2026-03-02T09:00:00.000Z',
      '2026-03-02T10:00:00.000Z',
      '2026-03-02T10:00:00.000Z',
    ]);
  });

  it('has nothing to lose before files are there', async () => {
    const { fixture } = await open();
    expect(fixture.componentInstance.unsaved()).toBeNull();
  });

  it('asks for the unit that a file leaves out and reads it again with the one chosen', async () => {
    const { element, settle, drop, http } = await open();
    const [first] = await drop('a.csv');
    const detail = 'Column 2: found no unit of level, expected dBuV, dBm or dBmV, in the file or given with it.';
    first.flush(
      { ...aProblem, line: undefined, detail, needs: 'levelUnit' },
      { status: 422, statusText: 'Unprocessable' },
    );
    await settle();
    expect(element.querySelector('app-file-card')?.textContent).toContain('needs its units');
    const [, level] = element.querySelectorAll<HTMLSelectElement>('app-units-asked select');
    level.value = 'dBm';
    level.dispatchEvent(new Event('change'));
    await settle();
    const again = http.expectOne({ method: 'POST', url: '/api/teams/power/readings' });
    expect(JSON.parse((again.request.body as FormData).get('options') as string)).toEqual({ levelUnit: 'dBm' });
  });

  it('tells a viewer why there is nothing to drop files on', async () => {
    const { element } = await open(false);
    expect(element.querySelector('app-file-drop')).toBeNull();
    expect(element.textContent).toContain('A viewer cannot import sweeps');
  });
});
