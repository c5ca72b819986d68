import { test as base } from '@playwright/test';
import type { BrowserContext } from '@playwright/test';

/**
 * The `test` of every journey. Whatever else a journey looks at, it fails when a page of it writes an error or a
 * warning to the console, breaks the content policy, throws, or asks for anything from another origin.
 */
export const test = base.extend({
  context: async ({ context, baseURL }, use) => {
    const faults: string[] = [];
    await watch(context, new URL(baseURL ?? '').origin, (fault) => { faults.push(fault); });
    await use(context);
    expect(faults, 'console errors and warnings, policy violations, requests elsewhere').toEqual([]);
  },
});

export { expect } from '@playwright/test';
import { expect } from '@playwright/test';

async function watch(context: BrowserContext, origin: string, report: (fault: string) => void): Promise<void> {
  context.on('console', (message) => {
    if (message.type() === 'error' || message.type() === 'warning') report(`console ${message.type()}: ${message.text()}`);
  });
  context.on('weberror', (error) => { report(`thrown: ${error.error().message}`); });
  context.on('request', (request) => {
    const { protocol, origin: asked } = new URL(request.url());
    // These two are answered by the browser itself.
    if (protocol !== 'data:' && protocol !== 'about:' && asked !== origin) report(`request to ${request.url()}`);
  });
  await context.exposeFunction('reportPolicyViolation', (what: string) => { report(`content policy: ${what}`); });
  await context.addInitScript(() => {
    document.addEventListener('securitypolicyviolation', ({ violatedDirective, blockedURI }) => {
      const { reportPolicyViolation } = globalThis as unknown as { reportPolicyViolation: (what: string) => void };
      reportPolicyViolation(`${violatedDirective} ${blockedURI}`);
    });
  });
}
