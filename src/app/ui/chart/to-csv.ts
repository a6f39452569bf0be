/** Rows as comma-separated text with CR LF (RFC 4180); cells with commas, quotes or line breaks are quoted. */
export function toCsv(rows: Iterable<readonly (string | number | null)[]>): string {
  let text = '';
  for (const row of rows) text += `${row.map(cell).join(',')}\r\n`;
  return text;
}

/** A text that a spreadsheet would take for a formula; the names of the lines "+" and "-" alone are none. */
const FORMULA = /^[=+\-@\t].+/s;

function cell(content: string | number | null): string {
  const text = content === null ? '' : typeof content === 'string' ? asText(content) : String(content);
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}

/** Keeps a spreadsheet from running what somebody wrote into a name or note; numbers in text stay numbers. */
function asText(text: string): string {
  return FORMULA.test(text) && Number.isNaN(Number(text)) ? `'${text}` : text;
}
