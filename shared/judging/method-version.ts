/** Goes into every stored judgement; rises whenever the same data could be judged differently. */
export const METHOD_VERSION = 1;
