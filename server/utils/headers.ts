/**
 * Headers that every response carries, whatever sends it: pages, JSON, errors, files, redirects.
 * A rendered page replaces the policy with its own, which admits its scripts by nonce. Styles are let in for drawings (SVG) and for the
 * page of last resort.
 */
export const safeHeaders: Readonly<Record<string, string>> = {
  'Content-Security-Policy': 'default-src \'none\'; style-src \'unsafe-inline\'; base-uri \'none\'; form-action \'none\'; frame-ancestors \'none\'',
  'Strict-Transport-Security': 'max-age=31536000; includeSubDomains',
  'X-Content-Type-Options': 'nosniff',
  'X-Frame-Options': 'DENY',
  'Referrer-Policy': 'strict-origin-when-cross-origin',
  'Cross-Origin-Opener-Policy': 'same-origin',
  'Cross-Origin-Resource-Policy': 'same-origin',
}
