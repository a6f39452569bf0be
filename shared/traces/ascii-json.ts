/** Writes a value as JSON in ASCII bytes; what is beyond ASCII becomes a \u escape. */
export function asciiJsonBytes(value: unknown): Uint8Array {
  const text = JSON.stringify(value).replace(
    /[^\x20-\x7e]/g,
    (unit) => `\\u${unit.charCodeAt(0).toString(16).padStart(4, '0')}`,
  );
  return Uint8Array.from(text, (character) => character.charCodeAt(0));
}

/** Reads JSON written by asciiJsonBytes. */
export function parseAsciiJson(bytes: Uint8Array): unknown {
  let text = '';
  for (const byte of bytes) text += String.fromCharCode(byte);
  return JSON.parse(text);
}
