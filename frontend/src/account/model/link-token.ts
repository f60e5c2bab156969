/** The token stands behind the hash, so that it reaches no server's log. */
export function readLinkToken(): string {
  return decodeURIComponent(window.location.hash.replace(/^#/, ''));
}
