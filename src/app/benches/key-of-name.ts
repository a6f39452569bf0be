const LONGEST_KEY = 63;

/** A key that tokens and files can use, made of a name: "Bench 2, hall B" gives "bench-2-hall-b". */
export function keyOfName(name: string): string {
  return name
    .normalize('NFKD')
    .toLowerCase()
    .replace(/\p{Mark}/gu, '')
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+/, '')
    .slice(0, LONGEST_KEY)
    .replace(/-+$/, '');
}
