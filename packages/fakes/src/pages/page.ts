import { createHash } from 'node:crypto';
import type { Response } from 'express';
import { Html, html } from './html.ts';

const style = `
:root{color-scheme:light dark;--ground:#f3f3f1;--sheet:#fff;--line:#d2d2cd;--edge:#77786f;--ink:#1d1d1b;--ink-2:#55564f;--act:#3d3a6b;--on-act:#fff;--bad:#8f2414;--bad-wash:#f8e6e2}
@media(prefers-color-scheme:dark){:root{--ground:#161615;--sheet:#1f1f1e;--line:#3a3a37;--edge:#8b8c83;--ink:#ecece8;--ink-2:#b9bab2;--act:#b9b5f0;--on-act:#17162b;--bad:#ff9d8a;--bad-wash:#3b1d17}}
*{box-sizing:border-box}
body{margin:0;background:var(--ground);color:var(--ink);font:400 1rem/1.5 system-ui,sans-serif}
header{border-bottom:1px solid var(--line);background:var(--sheet);padding:12px 16px;font-weight:600}
header small{display:block;font-weight:400;color:var(--ink-2)}
main{max-width:34rem;margin:0 auto;padding:24px 16px 64px}
main.wide{max-width:80rem}
h1{font-size:1.5rem;line-height:2rem;margin:0 0 8px;font-weight:600}
h2{font-size:1.125rem;margin:32px 0 8px;font-weight:600}
p{margin:0 0 12px}
a{color:var(--act)}
.quiet{color:var(--ink-2)}
.sum{font-size:1.75rem;line-height:2.25rem;font-variant-numeric:tabular-nums;margin:0 0 16px}
fieldset{border:1px solid var(--line);background:var(--sheet);margin:0 0 20px;padding:8px 16px 4px}
legend{font-weight:600;padding:0 4px}
label.pick{display:flex;gap:12px;align-items:center;min-height:44px;padding:6px 0;border-top:1px solid var(--line)}
legend+label.pick{border-top:0}
label.pick input{width:20px;height:20px;flex:none;accent-color:var(--act)}
label.pick code{display:block;color:var(--ink-2)}
label.field{display:block;font-weight:600;margin-bottom:16px}
label.field input{display:block;width:100%;min-height:44px;margin-top:4px;padding:8px 12px;font:inherit;color:inherit;background:var(--sheet);border:1px solid var(--edge);border-radius:2px}
button,.button{display:inline-flex;align-items:center;min-height:44px;padding:8px 20px;font:600 1rem/1.25 system-ui,sans-serif;border:1px solid var(--act);border-radius:2px;background:var(--act);color:var(--on-act);cursor:pointer;text-decoration:none}
button.second,.button.second{background:none;color:var(--act)}
button.small{min-height:44px;padding:4px 12px;font-size:.875rem;font-weight:500;background:none;color:var(--act)}
form.inline{display:inline-block;margin-right:8px}
summary{min-height:44px;padding:10px 0;border-top:1px solid var(--line);cursor:pointer}
.row{display:flex;flex-wrap:wrap;gap:12px;align-items:center}
.alert{border-left:4px solid var(--bad);background:var(--bad-wash);color:var(--ink);padding:12px 16px;margin:0 0 20px}
:focus-visible{outline:3px solid var(--act);outline-offset:2px}
.scroll{overflow-x:auto;background:var(--sheet);border:1px solid var(--line)}
table{border-collapse:collapse;width:100%;font-size:.875rem}
caption{text-align:left;padding:0}
th,td{text-align:left;padding:8px 12px;border-top:1px solid var(--line);vertical-align:top}
thead th{border-top:0;font-weight:600}
td.num,th.num{text-align:right;font-variant-numeric:tabular-nums;white-space:nowrap}
td code{overflow-wrap:anywhere;font-size:.8125rem}
iframe{width:100%;height:20rem;border:1px solid var(--line);background:#fff}
pre{white-space:pre-wrap;overflow-wrap:anywhere;background:var(--sheet);border:1px solid var(--line);padding:16px;margin:0 0 16px;font-size:.9375rem}
dl{display:grid;grid-template-columns:max-content 1fr;gap:4px 16px;margin:0 0 16px}
dt{color:var(--ink-2)}
dd{margin:0;overflow-wrap:anywhere}
`;

const styleHash = createHash('sha256').update(style).digest('base64');
/** Written without a template around it: one more space inside and browsers refuse it. */
const styleElement = new Html(`<style>${style}</style>`);

interface PageInput {
  /** Whose page this is, shown on top. */
  owner: string;
  note: string;
  title: string;
  body: Html;
  wide?: boolean;
  status?: number;
  /** Addresses a form of this page may end at after its redirect; browsers check them too. */
  leadsTo?: (string | null | undefined)[];
}

/** Sends a whole page with a policy that lets nothing run and nothing load. */
export function sendPage(
  res: Response,
  { owner, note, title, body, wide, status = 200, leadsTo = [] }: PageInput,
): void {
  const origins = leadsTo.flatMap((address) => (address ? [new URL(address).origin] : []));
  const policy = [
    "default-src 'none'",
    `style-src 'sha256-${styleHash}'`,
    `form-action ${["'self'", ...new Set(origins)].join(' ')}`,
    'img-src data:',
    "frame-src 'self'",
    "base-uri 'none'",
    "frame-ancestors 'none'",
  ];
  const page = html`<!doctype html>
    <html lang="en">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <meta name="robots" content="noindex" />
        <link rel="icon" href="data:," />
        <title>${title} – ${owner}</title>
        ${styleElement}
      </head>
      <body>
        <header>${owner}<small>${note}</small></header>
        <main class="${wide ? 'wide' : 'narrow'}">${body}</main>
      </body>
    </html>`;
  res
    .status(status)
    .set({
      'Content-Security-Policy': policy.join('; '),
      'Referrer-Policy': 'no-referrer',
      'X-Content-Type-Options': 'nosniff',
    })
    .set('Cache-Control', 'no-store')
    .type('html')
    .send(page.text);
}
