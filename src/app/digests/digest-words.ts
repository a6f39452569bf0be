import type { DigestView } from '@shared/contracts/digests';
import type { JobRunView } from '@shared/contracts/job-runs';
import { formatTime } from '../ui/format-time';

/** Days of the week by their ISO number less one. */
export const WEEKDAYS = ['Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday', 'Sunday'] as const;

/** A full hour on the wall clock: "07:00". */
export function hourText(hour: number): string {
  return `${String(hour).padStart(2, '0')}:00`;
}

/** When the next digest goes out: "Monday 7 Dec 2026, 07:00 in Europe/Stockholm". */
export function nextWords({ isOn, nextAt, timeZone }: Pick<DigestView, 'isOn' | 'nextAt' | 'timeZone'>): string {
  if (!isOn || nextAt === null) return 'The digest is off: nobody gets one.';
  const weekday = new Intl.DateTimeFormat('en-GB', { weekday: 'long', timeZone }).format(new Date(nextAt));
  return `The next one goes out on ${weekday} ${formatTime(nextAt, timeZone)} in ${timeZone}.`;
}

/** The week a digest is about, "2026-W49"; one somebody asked for stands outside the weeks. */
export function periodWords(period: string): string {
  return /^\d{4}-W\d{2}$/.test(period) ? period : 'on request';
}

/** How far the digest somebody asked for has come. */
export function sendingWords(run: Pick<JobRunView, 'status' | 'errors'>): string {
  switch (run.status) {
    case 'waiting':
      return 'Waiting for its turn.';
    case 'running':
      return 'Writing it.';
    case 'failed':
      return `It could not be written: ${run.errors[0]?.message ?? 'see Job runs for why'}.`;
    case 'done':
      return run.errors.length > 0
        ? `It was written, with trouble: ${run.errors[0].message}.`
        : 'It is on its way to you.';
  }
}
