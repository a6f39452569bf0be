import { computed, inject, Signal } from '@angular/core';
import { ThemeChoice } from '../theme-choice';

/** Colours of src/theme/_palette.scss that charts draw with, as the canvas wants them. */
const VARIABLES = {
  surface: '--sl-surface',
  ink: '--sl-ink',
  inkMuted: '--sl-ink-muted',
  hairline: '--sl-hairline',
  outline: '--sl-outline',
  accent: '--sl-accent',
  limit: '--sl-trace-limit',
  reference: '--sl-trace-reference',
  background: '--sl-trace-background',
  lost: '--sl-lost',
  lostGround: '--sl-lost-ground',
  gained: '--sl-gained',
  held: '--sl-held',
  unsure: '--sl-unsure',
  overText: '--sl-margin-text-over',
  marginPlenty: '--sl-margin-plenty',
  marginAmple: '--sl-margin-ample',
  marginClear: '--sl-margin-clear',
  marginNear: '--sl-margin-near',
  marginTight: '--sl-margin-tight',
  marginOver: '--sl-margin-over',
  marginFarOver: '--sl-margin-far-over',
  unmeasured: '--sl-margin-unmeasured',
  unmeasuredDot: '--sl-margin-unmeasured-dot',
  hatch: '--sl-margin-hatch',
} as const;

const TRACE_VARIABLES = [1, 2, 3, 4, 5, 6, 7, 8].map((trace) => `--sl-trace-${trace}`);

export type ChartPalette = Record<keyof typeof VARIABLES, string> & {
  /** Eight colours that stay apart under the common colour-vision deficiencies. */
  traces: readonly string[];
};

/** The palette of the present theme, read anew when the theme changes; called in an injection context. */
export function chartPalette(): Signal<ChartPalette> {
  const theme = inject(ThemeChoice);
  return computed(() => {
    theme.isDark();
    return readChartPalette();
  });
}

function readChartPalette(): ChartPalette {
  // Custom properties come back as written (light-dark(...)); only a real colour property resolves them.
  const probe = document.body.appendChild(document.createElement('span'));
  const read = (variable: string): string => {
    probe.style.color = `var(${variable})`;
    return getComputedStyle(probe).color;
  };
  const named = Object.entries(VARIABLES).map(([name, variable]) => [name, read(variable)]);
  const palette = { ...Object.fromEntries(named), traces: TRACE_VARIABLES.map(read) } as ChartPalette;
  probe.remove();
  return palette;
}
