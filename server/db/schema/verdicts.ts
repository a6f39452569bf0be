import { DETECTORS, LINES } from '@shared/detectors/detectors';
import type { BandJudgement } from '@shared/judging/band-judgement';
import { VERDICTS } from '@shared/judging/verdict';
import { index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { builds } from './builds';
import { moment, rowId } from './columns';
import { operatingStates } from './operating-states';

/** The judgement of one band of one series of a build, replaced whole when the build is judged again (team through the build). */
export const verdicts = sqliteTable(
  'verdicts',
  {
    id: rowId(),
    buildId: integer('build_id')
      .notNull()
      .references(() => builds.id),
    stateId: integer('state_id')
      .notNull()
      .references(() => operatingStates.id),
    line: text('line', { enum: LINES }).notNull(),
    detector: text('detector', { enum: DETECTORS }).notNull(),
    band: text('band').notNull(),
    verdict: text('verdict', { enum: VERDICTS }).notNull(),
    isOverLimit: integer('is_over_limit', { mode: 'boolean' }).notNull(),
    differenceDb: real('difference_db'),
    worstMarginDb: real('worst_margin_db'),
    worstFrequencyHz: real('worst_frequency_hz'),
    /** Every number of the judgement, as `shared/judging` returned it. */
    judgement: text('judgement', { mode: 'json' }).$type<BandJudgement>().notNull(),
    methodVersion: integer('method_version').notNull(),
    judgedAt: moment('judged_at').notNull(),
  },
  (table) => [
    uniqueIndex('verdicts_series').on(table.buildId, table.stateId, table.line, table.detector, table.band),
    index('verdicts_verdict').on(table.buildId, table.verdict),
  ],
);
