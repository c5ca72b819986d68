import type { Plugin } from 'vite';

/** Everything comes from the program's own files; nothing inline, nothing from elsewhere, nothing sent anywhere. */
const policy = [
  "default-src 'none'",
  "script-src 'self'",
  "style-src 'self'",
  "img-src 'self' data:",
  "font-src 'self'",
  "connect-src 'self'",
  "worker-src 'self'",
  "manifest-src 'self'",
  "base-uri 'none'",
  "form-action 'none'",
].join('; ');

/** Headers of the served build. Framing can be forbidden only here: a meta element cannot say it. */
export const policyHeaders = {
  'Content-Security-Policy': `${policy}; frame-ancestors 'none'`,
  'Referrer-Policy': 'no-referrer',
  'X-Content-Type-Options': 'nosniff',
};

/** Puts the policy into the built page, so that it holds whichever server hands the page out. */
export function contentPolicy(): Plugin {
  return {
    name: 'content-policy',
    // The development server needs inline scripts, so only the build is bound.
    apply: 'build',
    transformIndexHtml: () => [
      { tag: 'meta', attrs: { 'http-equiv': 'Content-Security-Policy', content: policy }, injectTo: 'head-prepend' },
    ],
  };
}
