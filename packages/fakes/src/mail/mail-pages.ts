import express, { type Response, type Router } from 'express';
import { html, type Html } from '../pages/html.ts';
import { sendPage } from '../pages/page.ts';
import { WEB_ADDRESS, type Mail, type Mailbox } from './mailbox.ts';

/** The catcher's JSON API and its readable pages. */
export function createMailPages(mailbox: Mailbox): Router {
  const pages = express.Router();
  pages.get('/api/mails', (req, res) => {
    res.json(mailbox.list(typeof req.query.to === 'string' ? req.query.to : undefined));
  });
  pages.get('/api/mails/:id', (req, res) => {
    const mail = mailbox.find(req.params.id);
    if (mail) res.json(mail);
    else res.status(404).json({ error: { message: 'No such mail.' } });
  });
  pages.delete('/api/mails', (_req, res) => {
    mailbox.clear();
    res.status(204).end();
  });
  pages.get('/', (req, res) => sendList(res, mailbox, typeof req.query.to === 'string' ? req.query.to : ''));
  pages.get('/mails/:id', (req, res) => sendMail(res, mailbox.find(req.params.id)));
  pages.get('/mails/:id/html', (req, res) => sendMarkup(res, mailbox.find(req.params.id)));
  pages.use((_req, res) => sendMail(res, undefined));
  return pages;
}

function send(res: Response, input: { title: string; body: Html; status?: number; wide?: boolean }): void {
  sendPage(res, { owner: 'Mail (local stand-in)', note: 'Every mail the market sends ends here.', ...input });
}

function whenText(mail: Mail): string {
  return `${mail.at.slice(0, 19).replace('T', ' ')} UTC`;
}

function sendList(res: Response, mailbox: Mailbox, to: string): void {
  const mails = mailbox.list(to || undefined).slice(0, 200);
  const rows = mails.map(
    (mail) =>
      html`<tr>
        <td><a href="mails/${mail.id}">${mail.subject}</a></td>
        <td>${mail.to.join(', ')}</td>
        <td>${whenText(mail)}</td>
      </tr>`,
  );
  const list = html`<div class="scroll" tabindex="0" role="region" aria-label="Mails">
    <table>
      <thead>
        <tr>
          <th scope="col">Subject</th>
          <th scope="col">To</th>
          <th scope="col">Time</th>
        </tr>
      </thead>
      <tbody>
        ${rows}
      </tbody>
    </table>
  </div>`;
  const body = html`<h1>Mails</h1>
    <form method="get">
      <label class="field">Only to this address<input name="to" type="email" value="${to}" autocomplete="off" /></label>
      <p><button class="second">Show</button></p>
    </form>
    ${mails.length > 0 ? list : html`<p class="quiet">No mail yet.</p>`}`;
  send(res, { title: 'Mails', body, wide: true });
}

/** Text with its addresses as links; everything else is escaped by the template. */
function linked(text: string): Html[] {
  const parts = text.split(new RegExp(`(${WEB_ADDRESS.source})`));
  return parts.map((part, index) => (index % 2 === 1 ? html`<a href="${part}">${part}</a>` : html`${part}`));
}

function sendMail(res: Response, mail: Mail | undefined): void {
  if (!mail) return send(res, { title: 'No such page', status: 404, body: html`<h1>No such page</h1>` });
  const body = html`<p><a href="../">All mails</a></p>
    <h1>${mail.subject}</h1>
    <dl>
      <dt>From</dt>
      <dd>${mail.from}</dd>
      <dt>To</dt>
      <dd>${mail.to.join(', ')}</dd>
      <dt>Time</dt>
      <dd>${whenText(mail)}</dd>
    </dl>
    <pre>${linked(mail.text)}</pre>
    ${
      mail.html &&
      html`<h2>As HTML</h2>
        <iframe
          title="The mail as HTML"
          src="${mail.id}/html"
          sandbox="allow-popups allow-popups-to-escape-sandbox allow-top-navigation-by-user-activation"
        ></iframe>`
    }`;
  send(res, { title: mail.subject, body });
}

/** The HTML part by itself: nothing in it may run or load, and its links open outside the frame. */
function sendMarkup(res: Response, mail: Mail | undefined): void {
  if (!mail?.html) return void res.status(404).type('text/plain').send('This mail has no HTML part.');
  const policy = [
    "default-src 'none'",
    "style-src 'unsafe-inline'",
    'img-src data:',
    "frame-ancestors 'self'",
    'sandbox allow-popups allow-popups-to-escape-sandbox allow-top-navigation-by-user-activation',
  ];
  res.set({ 'Content-Security-Policy': policy.join('; '), 'Cache-Control': 'no-store' }).type('html');
  res.send(`<!doctype html><base target="_top">${mail.html}`);
}
