const LOOPBACK = ['localhost', '127.0.0.1', '[::1]'];

/**
 * An address in a mail as this page can open it. Mails name the machine by one name; whoever reads them on the same
 * machine under another of its own names would arrive signed out, since a session belongs to the name.
 */
export function onOwnOrigin(address: string, own: Pick<Location, 'origin' | 'hostname' | 'port'>): string {
  if (!URL.canParse(address)) return address;
  const url = new URL(address);
  const isThisMachine = LOOPBACK.includes(url.hostname) && LOOPBACK.includes(own.hostname) && url.port === own.port;
  return isThisMachine ? `${own.origin}${url.pathname}${url.search}${url.hash}` : address;
}
