import type { BrowserContext } from '@playwright/test';

/**
 * What a person would only find in the browser's console: errors, pages that threw, violations of the content policy.
 * Refusals that a journey provokes on purpose don't count.
 */
export async function watchTroubles(context: BrowserContext, troubles: string[]): Promise<void> {
  await context.addInitScript(() => {
    document.addEventListener('securitypolicyviolation', ({ violatedDirective, blockedURI, sourceFile }) => {
      console.error(`Content policy: ${violatedDirective} ${blockedURI} ${sourceFile}`);
    });
  });
  context.on('console', (message) => {
    if (message.type() !== 'error' || isRefusal(message.text())) return;
    troubles.push(`${message.page()?.url() ?? ''}: ${message.text()} (${message.location().url})`);
  });
  context.on('weberror', (error) => {
    troubles.push(`${error.page()?.url() ?? ''}: ${error.error().message}`);
  });
}

/** What the browser itself logs when the market refuses something, or when a test has cut the connection. */
const isRefusal = (text: string) =>
  /the server responded with a status of (400|401|403|404|409|410|413|415|422)\b|net::ERR_INTERNET_DISCONNECTED/.test(
    text,
  );
