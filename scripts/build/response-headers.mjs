/** Features a page could ask the browser for; none is allowed to anybody. */
const refusedFeatures = [
  'accelerometer', 'autoplay', 'camera', 'display-capture', 'encrypted-media', 'fullscreen', 'geolocation', 'gyroscope',
  'magnetometer', 'microphone', 'midi', 'payment', 'picture-in-picture', 'publickey-credentials-get', 'screen-wake-lock',
  'usb', 'web-share', 'xr-spatial-tracking',
];

/** Headers of every answer. The content security policy carries a nonce and stands in `proxy.ts`. */
export const securityHeaders = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'Referrer-Policy', value: 'strict-origin-when-cross-origin' },
  { key: 'Permissions-Policy', value: refusedFeatures.map((name) => `${name}=()`).join(', ') },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
];

/**
 * The circuit engine and its worker under `/vendor`. A worker obeys the policy of its own answer: the engine compiles
 * WebAssembly and reads it from a `data:` address. Names carry the version, so the answer may be kept for a year.
 */
export const engineHeaders = [
  { key: 'Content-Security-Policy', value: "default-src 'none'; script-src 'self' 'wasm-unsafe-eval'; connect-src 'self' data:" },
  { key: 'Cache-Control', value: 'public, max-age=31536000, immutable' },
  { key: 'X-Content-Type-Options', value: 'nosniff' },
];
