const loopbackHosts = ['localhost', '127.0.0.1', '[::1]'];

/** Whether a host's name reaches this machine alone. */
const isLoopback = (host: string): boolean =>
  host === '::1' || loopbackHosts.includes(host) || /^127(\.\d{1,3}){3}$/.test(host);

/** Where a server listens, and the address people open where that is another. */
type Address = {
  readonly publicUrl: string | undefined;
  readonly host: string;
  readonly port: number;
};

/** Whether nobody but people at this machine can reach a server: a proxy may stand on loopback for others. */
export const isOnThisMachineAlone = ({
  publicUrl,
  host,
  trustedProxies,
}: Omit<Address, 'port'> & { readonly trustedProxies: number }): boolean =>
  trustedProxies === 0 &&
  isLoopback(host) &&
  (publicUrl === undefined || isLoopback(new URL(publicUrl).hostname));

/**
 * Addresses our own pages are opened under, as browsers write an origin: scheme, name and port. On loopback all its names will do; else only what
 * `PUBLIC_URL` says or, without it, the host itself.
 */
export function ownOrigins(at: Address): readonly string[] {
  const loopbacks = (port: string) =>
    loopbackHosts.map((host) => new URL(`http://${host}${port}`).origin);
  if (at.publicUrl !== undefined) {
    const { origin, hostname, protocol, port } = new URL(at.publicUrl);
    const alsoLoopback = protocol === 'http:' && isLoopback(hostname);
    return alsoLoopback ? loopbacks(port === '' ? '' : `:${port}`) : [origin];
  }
  const named = at.host.includes(':') ? `[${at.host}]` : at.host;
  return [
    ...loopbacks(`:${at.port}`),
    ...(isLoopback(at.host) ? [] : [new URL(`http://${named}:${at.port}`).origin]),
  ];
}
