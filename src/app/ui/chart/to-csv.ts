/** Rows as comma-separated text with CR LF (RFC 4180); cells with commas, quotes or line breaks are quoted. */
export function toCsv(rows: Iterable<readonly (string | number | null)[]>): string {
  let text = '';
  for (const row of rows) text += `${row.map(cell).join(',')}\r\n`;
  return text;
}

function cell(content: string | number | null): string {
  const text = content === null ? '' : String(content);
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
