/**
 * A message of the server as a sentence: a capital first, a full stop last. A first word that is no plain word,
 * such as a file name or a key, stays as it is.
 */
export function asSentence(text: string): string {
  const capital = /^[a-z]+ /.test(text) ? text.charAt(0).toUpperCase() + text.slice(1) : text;
  return /[.!?]$/.test(capital) ? capital : `${capital}.`;
}
