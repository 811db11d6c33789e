import { randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import type { LotDraft, MyLotView } from '@lydite/contracts';
import type { Call } from './calls.ts';

const photos = new URL('../../apps/api/src/seeds/photos/', import.meta.url);

/** One of the photos of the demo market, as a file somebody chooses. */
export const photoFile = (name: string) => ({
  name: `${name}.jpg`,
  mimeType: 'image/jpeg',
  buffer: readFileSync(new URL(`${name}.jpg`, photos)),
});

/** A draft that lacks nothing but a photo: memory modules, counted and weighed. */
export const draftOf = (draft: Partial<LotDraft> = {}): LotDraft => ({
  title: 'Memory modules, older make',
  description: 'Pulled from office machines, dry and clean.',
  lines: [
    {
      id: randomUUID(),
      label: 'Memory modules',
      classCode: 'memory-modules',
      identityEvidence: 'photographed',
      massG: 12_400,
      massText: '12.4',
      massUnit: 'kg',
      massEvidence: 'weighed',
      scaleResolutionG: 10,
      pieces: 560,
      countEvidence: 'counted',
      plating: null,
      contactsPerPiece: null,
      padAreaMm2: null,
      areaCm2PerPiece: null,
      pieceMassG: null,
      wear: null,
      assay: null,
    },
  ],
  sale: { form: 'open-bids', startMinor: 40_000, reserveMinor: null, askingMinor: null, days: 7 },
  delivery: { way: 'seller-sends', freightMinor: 1800, place: 'Ossenmere', hours: '' },
  declarations: {
    rightToSell: true,
    batteries: 'removed',
    batteriesNote: '',
    mercuryOrBeryllium: 'none',
    hazardNote: '',
    country: 'AT',
  },
  ...draft,
});

/** Begins a draft by calls, with what is given filled in. */
export async function beginDraft(call: Call, draft?: LotDraft): Promise<MyLotView> {
  const lot = await call<MyLotView>('POST /my/lots', { body: {} });
  if (!draft) return lot;
  return call<MyLotView>(`PUT /my/lots/${lot.code}`, { body: { version: lot.version, draft } });
}

/** Lists a lot by calls and returns its code. */
export async function listLot(call: Call, draft: Partial<LotDraft> = {}): Promise<string> {
  const { code, version } = await beginDraft(call, draftOf(draft));
  await call(`POST /my/lots/${code}/photos`, { form: { slot: 'whole', photo: photoFile('memory-rows') } });
  await call(`POST /my/lots/${code}/list`, { body: { version } });
  return code;
}
