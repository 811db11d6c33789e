#!/usr/bin/env node
import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { chromium } from '@playwright/test';
import sharp from 'sharp';
import { ensureBrowser } from './checks/browser.mjs';
import { Refusal, runScript } from './lib/main.mjs';
import { ensureDir, fromRoot, localDir } from './lib/root.mjs';
import { demoSignIns } from './stack/market.mjs';

const usage = `Takes the pictures of docs/screenshots from a running demo (npm start).

usage: npm run screenshots [-- ADDRESS] [--sign-ins FOLDER]

  ADDRESS              of the demo, http://localhost:4400 unless given
  --sign-ins FOLDER    that holds its sign-ins.json, .local unless given`;

const limitBytes = 350_000;
const widths = { 1440: { width: 1440, height: 900 }, 390: { width: 390, height: 844 } };
const headers = { 'x-lydite-client': 'screenshots' };

/** What is shown, by whom, and where that is found in the demo; `open` names a button to press first. */
const pictures = [
  { name: 'lots', role: 'buyer', find: async () => '/' },
  { name: 'lot', role: 'buyer', find: findOpenLot },
  { name: 'deal', role: 'buyer', find: findSettledDeal },
  { name: 'lots-mine', role: 'seller', find: async () => '/sell/lots' },
  { name: 'contents', role: 'seller', find: findDraft, open: /^Change / },
  { name: 'desk', role: 'operator', find: async () => '/desk' },
];

await runScript({
  usage,
  words: true,
  options: { 'sign-ins': { type: 'string', default: localDir } },
  async run({ values, positionals: [address = 'http://localhost:4400'] }) {
    const signIns = demoSignIns(values['sign-ins']);
    if (signIns.length === 0) throw new Refusal('No demo sign-ins found. Start the demo with npm start first.');
    const browser = await chromium.launch({ executablePath: ensureBrowser(), args: ['--no-sandbox', '--disable-gpu'] });
    try {
      for (const picture of pictures) await takePicture({ browser, address, signIns, picture });
    } finally {
      await browser.close();
    }
  },
});

async function takePicture({ browser, address, signIns, picture: { name, role, find, open } }) {
  for (const [width, viewport] of Object.entries(widths)) {
    const isPhone = width === '390';
    const context = await browser.newContext({
      baseURL: address,
      viewport,
      locale: 'en-GB',
      timezoneId: 'Europe/Vienna',
      deviceScaleFactor: isPhone ? 2 : 1,
    });
    const { email, password } = signIns.find((one) => one.role === role);
    await context.request.post('/api/session', { headers, data: { email, password } });
    const read = async (path) => (await context.request.get(`/api${path}`)).json();
    const page = await context.newPage();
    await page.goto(await find(read));
    if (open) await page.getByRole('button', { name: open }).first().click();
    for (const colorScheme of ['light', 'dark']) {
      await page.emulateMedia({ colorScheme });
      await page.getByRole('heading', { level: 1 }).waitFor();
      await page.waitForLoadState('networkidle');
      await save({ png: await page.screenshot(), file: `${name}-${width}-${colorScheme}.png` });
    }
    await context.close();
  }
}

/** A palette keeps the text crisp; fewer colours are tried until the file is small enough. */
async function save({ png, file }) {
  for (const colours of [256, 128, 64, 32]) {
    const small = await sharp(png).png({ palette: true, colours, effort: 10 }).toBuffer();
    if (small.length > limitBytes && colours > 32) continue;
    writeFileSync(join(ensureDir(fromRoot('docs/screenshots')), file), small);
    return console.log(`${file}: ${Math.round(small.length / 1000)} kB, ${colours} colours`);
  }
}

/** The lot on which this buyer leads against most others, or the first. */
async function findOpenLot(read) {
  const { rows } = await read('/lots?form=open-bids');
  const isLed = ({ you }) => Number(you?.standing === 'highest');
  const lot = rows.toSorted((a, b) => isLed(b) - isLed(a) || b.bidders - a.bidders)[0];
  return `/lots/${lot.code}`;
}

async function findSettledDeal(read) {
  const deals = await read('/my/deals?side=buyer');
  return `/deals/${(deals.find(({ state }) => state === 'settled') ?? deals[0]).code}`;
}

/** The draft with the most gold in it, on its second page. */
async function findDraft(read) {
  const lots = await read('/my/lots');
  const drafts = lots.filter(({ state }) => state === 'draft');
  const draft = drafts.toSorted((a, b) => (b.goldG?.p50 ?? 0) - (a.goldG?.p50 ?? 0))[0];
  return `/sell/lots/${draft.code}/contents`;
}
