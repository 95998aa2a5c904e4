import { z } from 'zod';
import { requestAsPerson } from '../../lib/request-as-person';

const entrySchema = z.object({
  id: z.string(),
  subject: z.string(),
  to: z.string(),
  messageId: z.string(),
  sentAt: z.string(),
});
/** A captured letter without its text. */
export type MailEntry = z.infer<typeof entrySchema>;

const letterSchema = entrySchema.extend({ text: z.string() });
export type Letter = z.infer<typeof letterSchema>;

/** @throws {HttpProblem} 404 where mail goes to a mail server */
export const listMail = (signal: AbortSignal): Promise<MailEntry[]> =>
  requestAsPerson('/api/mail', { signal }, (answer) => z.array(entrySchema).parse(answer));

export const readLetter = (id: string, signal: AbortSignal): Promise<Letter> =>
  requestAsPerson(`/api/mail/${encodeURIComponent(id)}`, { signal }, (answer) => letterSchema.parse(answer));
