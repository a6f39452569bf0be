import fc from 'fast-check';

/**
 * Property tests draw the same cases in every run, so that a failure concerns the change and can be had again.
 * PROPERTY_SEED=<number> draws others.
 */
fc.configureGlobal({ seed: Number(process.env['PROPERTY_SEED'] ?? 20_261_201) });
