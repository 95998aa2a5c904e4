import { z } from 'zod';
import { parseNumber } from '../../lib/parse-number';
import { bringInStrings } from '../../strings/bring-in';

const missing = bringInStrings.missing;
const substance = (message: string) =>
  z.object({ id: z.string(), name: z.string() }).refine(({ id }) => id !== '', message);
const words = (message: string, longest: number) => z.string().trim().min(1, message).max(longest, missing.tooLong);

const percent = z
  .string()
  .trim()
  .transform((text) => (text === '' ? null : (parseNumber(text) ?? Number.NaN)))
  .refine((value) => value === null || (value > 0 && value < 100), missing.commonPercent);

/** What must be known of a series before it can be kept. */
export const headerSchema = z
  .object({
    first: substance(missing.first),
    second: substance(missing.second),
    method: words(missing.method, 500),
    dataOrigin: z.enum(['TABLE', 'GRAPH', 'SMOOTHED', 'EQUATION']),
    title: words(missing.title, 300),
    source: words(missing.source, 2000),
    apparatus: z.string().max(500, missing.tooLong),
    commonPercent: percent,
    sameDataAsId: z.string(),
  })
  .refine(({ first, second }) => first.id === '' || first.id !== second.id, {
    path: ['second'],
    error: missing.samePair,
  });

export type Header = z.output<typeof headerSchema>;
