import { existsSync, mkdirSync, readFileSync, readdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { randomUUID } from 'node:crypto';
import { join } from 'node:path';
import { simpleParser, type AddressObject } from 'mailparser';

/** One caught mail. `to` are the addresses it was really sent to, whatever its head says. */
export interface Mail {
  id: string;
  at: string;
  from: string;
  to: string[];
  subject: string;
  text: string;
  html: string | null;
  /** Every http address in the text and the HTML part, once each, in order. */
  links: string[];
  headers: Record<string, string>;
}

/** An http address as people write it: a full stop or bracket after it is not part of it. */
export const WEB_ADDRESS = /https?:\/\/[^\s"'<>)\]]*[^\s"'<>)\].,;:!?]/g;

export type Mailbox = ReturnType<typeof openMailbox>;

/** Keeps mails as one JSON file each, so that they outlive a restart. */
export function openMailbox(dir: string) {
  mkdirSync(dir, { recursive: true });
  const mails = new Map<string, Mail>();
  for (const name of readdirSync(dir)
    .filter((file) => file.endsWith('.json'))
    .toSorted()) {
    const mail = JSON.parse(readFileSync(join(dir, name), 'utf8')) as Mail;
    mails.set(mail.id, mail);
  }
  let count = mails.size;
  return {
    /** Reads a raw message and keeps it. */
    async keep(raw: Buffer, envelopeTo: string[]): Promise<Mail> {
      const mail = await toMail(raw, { envelopeTo, id: nextId((count += 1)) });
      const path = join(dir, `${mail.id}.json`);
      writeFileSync(`${path}.new`, JSON.stringify(mail, null, 2));
      renameSync(`${path}.new`, path);
      mails.set(mail.id, mail);
      return mail;
    },
    /** Newest first; with an address only those sent to it, in any case. */
    list: (to?: string): Mail[] =>
      [...mails.values()]
        .filter((mail) => !to || mail.to.some((address) => address.toLowerCase() === to.toLowerCase()))
        .toReversed(),
    find: (id: string): Mail | undefined => mails.get(id),
    clear(): void {
      for (const id of mails.keys()) {
        const path = join(dir, `${id}.json`);
        if (existsSync(path)) rmSync(path);
      }
      mails.clear();
    },
  };
}

/** Ids sort by arrival, also as file names. */
function nextId(count: number): string {
  return `${String(Date.now()).padStart(14, '0')}-${String(count).padStart(6, '0')}-${randomUUID().slice(0, 8)}`;
}

async function toMail(raw: Buffer, { envelopeTo, id }: { envelopeTo: string[]; id: string }): Promise<Mail> {
  const parsed = await simpleParser(raw);
  const markup = parsed.html || null;
  const text = parsed.text ?? '';
  const found = `${text}\n${markup?.replaceAll('&amp;', '&') ?? ''}`.match(WEB_ADDRESS) ?? [];
  return {
    id,
    at: new Date().toISOString(),
    from: addressText(parsed.from),
    to: envelopeTo,
    subject: parsed.subject ?? '(no subject)',
    text,
    html: markup,
    links: [...new Set(found)],
    headers: Object.fromEntries(
      parsed.headerLines.map(({ key, line }) => [key, line.slice(line.indexOf(':') + 1).trim()]),
    ),
  };
}

function addressText(address: AddressObject | undefined): string {
  return address?.text ?? '';
}
