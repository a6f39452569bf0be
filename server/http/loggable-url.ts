/** Addresses that end in a secret: whoever reads the log must not be able to use the link. */
const SECRET = /^(\/api\/(?:invitations|password-resets|digest\/unsubscribe)\/)[^/?#]+/;

/** The address of a request as it may stand in the log. */
export function loggableUrl(url: string): string {
  return url.replace(SECRET, '$1[secret]');
}
