import { test as base, expect, type BrowserContext, type Page } from '@playwright/test';
import { createCall, signInByCall, type Call } from './calls.ts';
import { enrol, type EnrolOptions } from './enrol.ts';
import { demoSignIn } from './stack.ts';
import { watchTroubles } from './watch.ts';

/** Somebody in front of a browser of their own. */
export interface Visitor {
  context: BrowserContext;
  page: Page;
  /** Calls the API with this browser's session, to set up what a journey is not about. */
  call: Call;
}

export interface Member extends Visitor {
  email: string;
  password: string;
  name: string;
}

interface Market {
  /** A new browser, not signed in. */
  visitor: () => Promise<Visitor>;
  /** A new member, registered and confirmed, signed in. */
  member: (options: EnrolOptions) => Promise<Member>;
  /** Somebody of the demo market, signed in. */
  demo: (role: 'seller' | 'buyer' | 'operator' | 'assayer') => Promise<Member>;
}

/**
 * The test with a market: people in browsers of their own, all of the project's size and colours. Whatever the console of
 * any of them said is a failure at the end.
 */
export const test = base.extend<{ market: Market }>({
  market: async ({ browser }, use) => {
    const troubles: string[] = [];
    const opened: BrowserContext[] = [];
    const visitor = async (): Promise<Visitor> => {
      const context = await browser.newContext();
      opened.push(context);
      await watchTroubles(context, troubles);
      return { context, page: await context.newPage(), call: createCall(context.request) };
    };
    await use({
      visitor,
      member: async (enrolment) => {
        const person = await visitor();
        return { ...person, ...(await enrol(person.call, enrolment)) };
      },
      demo: async (role) => {
        const person = await visitor();
        const { email, password } = demoSignIn(role);
        await signInByCall(person.call, { email, password });
        return { ...person, email, password, name: role };
      },
    });
    await Promise.all(opened.map((context) => context.close()));
    expect(troubles).toEqual([]);
  },
});

export { expect };
