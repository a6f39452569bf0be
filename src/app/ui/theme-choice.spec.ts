import { TestBed } from '@angular/core/testing';
import { ThemeChoice } from './theme-choice';

function stubSystem(isDark: boolean): void {
  window.matchMedia = (query: string) =>
    ({
      matches: isDark && query.includes('dark'),
      media: query,
      addListener: () => undefined,
      removeListener: () => undefined,
    }) as unknown as MediaQueryList;
}

beforeEach(() => {
  localStorage.clear();
  document.documentElement.className = '';
});

it('follows the system until the person chooses, and keeps the choice', () => {
  stubSystem(true);
  const theme = TestBed.inject(ThemeChoice);
  expect(theme.isDark()).toBe(true);
  theme.choose('light');
  expect(theme.isDark()).toBe(false);
  expect(document.documentElement.className).toBe('theme-light');
  TestBed.resetTestingModule();
  expect(TestBed.inject(ThemeChoice).choice()).toBe('light');
});

it('goes back to the system', () => {
  stubSystem(false);
  const theme = TestBed.inject(ThemeChoice);
  theme.choose('dark');
  theme.choose('system');
  expect(theme.isDark()).toBe(false);
  expect(localStorage.getItem('strandline.theme')).toBeNull();
  expect(document.documentElement.className).toBe('');
});
