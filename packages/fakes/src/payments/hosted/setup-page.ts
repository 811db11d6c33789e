import type { Response } from 'express';
import type { Stripe } from 'stripe';
import { z } from 'zod';
import { html } from '../../pages/html.ts';
import { completeAccount, setBankAccount } from '../accounts.ts';
import type { SetupVisit } from '../kinds.ts';
import { FAILING_BANK_ACCOUNT } from '../resources/payouts.ts';
import type { Work } from '../work.ts';
import { sendProcessorPage } from './shell.ts';

const WORKING_BANK_ACCOUNT = '000123456789';

/** What the form of the set-up page sends. */
export const setupForm = z.object({
  name: z.string().trim().min(1).max(200),
  bank: z.enum([WORKING_BANK_ACCOUNT, FAILING_BANK_ACCOUNT]),
});

interface SetupPage {
  account: Stripe.Account;
  visit: SetupVisit;
  problem?: string;
}

/** The form in which a seller tells the processor who is paid, and where to. */
export function sendSetupPage(res: Response, { account, visit, problem }: SetupPage): void {
  const body = html` <h1>Set up payouts</h1>
    ${problem && html`<div class="alert" role="alert">${problem}</div>`}
    <p class="quiet">The market never sees these details.</p>
    <form method="post">
      <label class="field"
        >Name of the person or firm that is paid<input
          name="name"
          required
          maxlength="200"
          autocomplete="organization"
          value="${account.business_profile?.name ?? ''}"
      /></label>
      <fieldset>
        <legend>Bank account (US test numbers)</legend>
        <label class="pick"
          ><input type="radio" name="bank" value="${WORKING_BANK_ACCOUNT}" checked /><span
            >Payouts arrive<code>110000000 / ${WORKING_BANK_ACCOUNT}</code></span
          ></label
        >
        <label class="pick"
          ><input type="radio" name="bank" value="${FAILING_BANK_ACCOUNT}" /><span
            >The bank sends payouts back<code>110000000 / ${FAILING_BANK_ACCOUNT}</code></span
          ></label
        >
      </fieldset>
      <div class="row">
        <button>Finish</button>
        <a class="button second" href="${visit.returnUrl}">Leave without finishing</a>
      </div>
    </form>`;
  sendProcessorPage(res, { title: 'Set up payouts', body, status: problem ? 422 : 200, leadsTo: [visit.returnUrl] });
}

/** Takes the form's answers over; from now on transfers and payouts are possible. */
export function finishSetup(work: Work, account: Stripe.Account, form: z.output<typeof setupForm>): void {
  setBankAccount(work, account, { accountNumber: form.bank, routingNumber: '110000000', holder: form.name });
  const profile = { ...account.business_profile, name: form.name } as Stripe.Account.BusinessProfile;
  completeAccount(work, account, {
    business_profile: profile,
    tos_acceptance: { date: work.nowS, ip: '127.0.0.1', user_agent: null },
  });
}
