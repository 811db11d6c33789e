import { z } from 'zod';

const n = z.number();

/** Quantiles by probability in per cent, as in the valuation package. */
export const quantiles = z
  .object({ p0_15: n, p01: n, p05: n, p10: n, p25: n, p50: n, p75: n, p90: n, p95: n, p99: n, p99_5: n, p99_85: n })
  .meta({ id: 'Quantiles' });
const spread = z.object({ mean: n, sd: n, quantiles }).meta({ id: 'Spread' });
const density = z.object({ fromG: n, toG: n, perG: z.array(n) });

/** A frozen estimate: the valuation package's `Estimate`, field by field. Gold in grams, grades in g/t. */
export const storedEstimate = z
  .object({
    modelVersion: z.string(),
    catalogueVersion: z.string(),
    seed: z.int(),
    draws: z.int(),
    massG: n,
    goldG: spread,
    gradeGPerT: quantiles,
    beadsG: z.array(n),
    density,
    lines: z.array(
      z.object({
        id: z.string(),
        classCode: z.string(),
        massG: n,
        pieces: n.nullable(),
        goldG: spread,
        gradeGPerT: quantiles,
        varianceShare: n,
        components: z.array(z.object({ name: z.string(), goldG: spread })),
      }),
    ),
    drivers: z.array(
      z.object({
        lineId: z.string().nullable(),
        classCode: z.string(),
        parameter: z.string(),
        share: n,
        question: z.string(),
        nowG: z.tuple([n, n]),
        afterG: z.tuple([n, n]),
      }),
    ),
    warnings: z.array(z.object({ code: z.string(), lineId: z.string().nullable(), message: z.string() })),
  })
  .meta({ id: 'Estimate' });
export type StoredEstimate = z.infer<typeof storedEstimate>;

/** What a row of a list needs to draw a streak. */
export const outline = z
  .object({ massG: n, goldG: quantiles, gradeGPerT: quantiles, density })
  .meta({ id: 'EstimateOutline' });
export type EstimateOutline = z.infer<typeof outline>;

export const photoSlot = z.enum(['whole', 'one-piece', 'on-scale', 'odd-ones', 'markings', 'other']);
export type PhotoSlot = z.infer<typeof photoSlot>;

/** Pictures are at `/api/photos/<id>/<list|page|zoom>`. `colour` fills the place while one loads. */
export const photoView = z
  .object({
    id: z.uuid(),
    slot: photoSlot,
    description: z.string(),
    width: z.int(),
    height: z.int(),
    colour: z.string(),
  })
  .meta({ id: 'Photo' });
export type PhotoView = z.infer<typeof photoView>;
