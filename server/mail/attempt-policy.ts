const MINUTE_MS = 60_000;

/** Longer than one attempt can last. */
export const SHORTEST_WAIT_MS = 2 * MINUTE_MS;

/** Denser at first than the 30 minutes of RFC 5321 4.5.4.1: the server is the installation's own, and somebody waits for a link. */
const WAITS_MS = [SHORTEST_WAIT_MS, ...[10, 30, 120, 360, 1440].map((minutes) => minutes * MINUTE_MS)];

/** How long after its n-th attempt (1 first) a mail is tried again; undefined: that was the last. */
export function waitAfter(attempts: number): number | undefined {
  return WAITS_MS[attempts - 1];
}

/** What nodemailer adds to an error. */
interface DeliveryError {
  code?: string;
  responseCode?: number;
}

/** Whether it failed for this mail's address or content; otherwise the others of the run would fail too. */
export function isAboutThisMail(error: unknown): boolean {
  const { code } = error as DeliveryError;
  return code === 'EENVELOPE' || code === 'EMESSAGE';
}

/** Whether this very mail is refused for good; a reply 4yz asks to try again later (RFC 5321 4.2.1). */
export function isRefusedForGood(error: unknown): boolean {
  const { responseCode = 500 } = error as DeliveryError;
  return isAboutThisMail(error) && responseCode >= 500;
}
