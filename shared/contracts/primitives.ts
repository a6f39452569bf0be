import { DETECTORS, LINES, SWEEP_KINDS } from '@shared/detectors/detectors';
import { VERDICTS } from '@shared/judging/verdict';
import * as z from 'zod';

/** Name in an address: lower-case letters, digits and hyphens. */
export const Key = z
  .string()
  .regex(/^[a-z0-9][a-z0-9-]{0,62}$/, 'use lower-case letters, digits and hyphens, starting with a letter or digit');
/** One line of text that people see: no line break, tab or other control character, which mails and reports would trip over. */
export const Name = z
  .string()
  .trim()
  .min(1, 'must not be empty')
  .max(120)
  .regex(/^\P{Cc}*$/u, 'must be one line without control characters');
export const Notes = z.string().max(4000);
export const Email = z.string().trim().toLowerCase().pipe(z.email());
export const Password = z.string().min(12, 'use at least 12 characters').max(200);
/** Time as ISO 8601 with zone; stored and answered in UTC. */
export const Time = z.iso.datetime({ offset: true });
export const Line = z.enum(LINES);
export const DetectorName = z.enum(DETECTORS);
export const SweepKind = z.enum(SWEEP_KINDS);
export const VerdictName = z.enum(VERDICTS);
export type VerdictName = z.infer<typeof VerdictName>;
export const TimeZone = z.string().refine((zone) => {
  try {
    new Intl.DateTimeFormat('en', { timeZone: zone });
    return true;
  } catch {
    return false;
  }
}, 'is no IANA time zone such as Europe/Lisbon');
