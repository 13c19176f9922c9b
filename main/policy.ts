/**
 * What the window's page may do, the same in both hosts: load scripts, styles, fonts and pictures from its own files and
 * speak to its own host; nothing else, and nobody may frame it.
 */
const CONTENT: Readonly<Record<string, string>> = {
  'default-src': "'none'",
  'script-src': "'self'",
  'style-src': "'self'",
  'img-src': "'self' data:",
  'font-src': "'self'",
  'connect-src': "'self'",
  'base-uri': "'none'",
  'form-action': "'none'",
  'frame-ancestors': "'none'",
};

/** The content security policy. */
export const CONTENT_SECURITY_POLICY = Object.entries(CONTENT)
  .map(([directive, sources]) => `${directive} ${sources}`)
  .join('; ');

/** Powers of a browser that the window has no use for. */
const REFUSED_POWERS = [
  'camera',
  'display-capture',
  'fullscreen',
  'geolocation',
  'hid',
  'microphone',
  'midi',
  'payment',
  'serial',
  'usb',
];

/** Headers of everything that a host gives to the window. */
export const POLICY_HEADERS: Readonly<Record<string, string>> = {
  'Content-Security-Policy': CONTENT_SECURITY_POLICY,
  'Cross-Origin-Embedder-Policy': 'require-corp',
  'Cross-Origin-Opener-Policy': 'same-origin',
  'Cross-Origin-Resource-Policy': 'same-origin',
  'Permissions-Policy': REFUSED_POWERS.map((power) => `${power}=()`).join(', '),
  'Referrer-Policy': 'no-referrer',
  'X-Content-Type-Options': 'nosniff',
  'Cache-Control': 'no-store',
};
