import { z } from 'zod';
import { fill } from '../../lib/fill';
import { versionStrings } from '../../strings/versions';

const words = versionStrings.withdraw;

/** Why a version is withdrawn. */
export const withdrawReasons = ['series', 'correlation', 'identity', 'uncertainty', 'other'] as const;

export const withdrawSchema = z.object({
  reason: z.enum(withdrawReasons, words.needsReason),
  words: z.string().trim().min(1, words.needsWords),
  password: z.string().min(1, versionStrings.release.needsPassword),
});

/** The reason as readers see it in the banner: what was wrong, then the words. */
export function withdrawalReason({
  reason,
  words: text,
}: Pick<z.infer<typeof withdrawSchema>, 'reason' | 'words'>): string {
  if (reason === 'other') return text.trim();
  const name = words.reasons[reason];
  return fill(words.whole, { reason: name.charAt(0).toUpperCase() + name.slice(1), words: text.trim() });
}
