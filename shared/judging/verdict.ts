/** The four answers about a band of a build. */
export const VERDICTS = ['lost', 'gained', 'held', 'cannotSay'] as const;

export type Verdict = (typeof VERDICTS)[number];
