const LONGEST_KEY = 63;

/** A key for addresses, tokens and files that a name suggests: "Prüfplatz 2, hall B" gives "prufplatz-2-hall-b". */
export function keyOfName(name: string): string {
  return name
    .normalize('NFKD')
    .replace(/\p{Mark}/gu, '')
    .toLowerCase()
    .replace(/ß/g, 'ss')
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+/, '')
    .slice(0, LONGEST_KEY)
    .replace(/-+$/, '');
}
