interface PolicyInput {
  /** Base64 random value of this answer. */
  readonly nonce: string;
  /** Address of the room server, `ws:` or `wss:`. */
  readonly realtime: string;
  readonly secure: boolean;
  /** Reload in development evaluates code and injects styles. */
  readonly development: boolean;
}

/** The pages' Content-Security-Policy (CSP level 3): scripts by nonce, connections to this site and the room server only. */
export function contentSecurityPolicy({ nonce, realtime, secure, development }: PolicyInput): string {
  const room = `${new URL(realtime).protocol}//${new URL(realtime).host}`;
  const directives: readonly (readonly string[])[] = [
    ['default-src', "'self'"],
    ['script-src', "'self'", `'nonce-${nonce}'`, "'strict-dynamic'", "'wasm-unsafe-eval'", ...(development ? ["'unsafe-eval'"] : [])],
    ['style-src', "'self'", development ? "'unsafe-inline'" : `'nonce-${nonce}'`],
    ['style-src-attr', "'unsafe-inline'"],
    ['img-src', "'self'", 'data:', 'blob:'],
    ['font-src', "'self'"],
    ['connect-src', "'self'", room, ...(development ? ['ws:'] : [])],
    ['worker-src', "'self'"],
    ['object-src', "'none'"],
    ['base-uri', "'none'"],
    ['form-action', "'self'"],
    ['frame-ancestors', "'none'"],
    ...(secure ? [['upgrade-insecure-requests']] : []),
  ];
  return directives.map((directive) => directive.join(' ')).join('; ');
}
