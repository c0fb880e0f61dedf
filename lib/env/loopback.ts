/** True for host names that only this machine can reach (RFC 6761 `localhost`, RFC 1122 127/8, RFC 4291 ::1). */
export function isLoopbackHost(hostname: string): boolean {
  const name = hostname.toLowerCase().replace(/^\[|\]$/g, '');
  return name === 'localhost' || name.endsWith('.localhost') || name === '::1' || /^127(\.\d{1,3}){3}$/.test(name);
}
