import { z } from 'zod';
import { type RecordReviewInput, type ReviewVerdict } from '../../gql/graphql';

/** Answers a reviewer may give; empty while a question is open. */
export const answers = ['yes', 'no', 'does not apply'] as const;
export type Answer = (typeof answers)[number];

export const reviewSchema = z.object({
  answers: z.array(z.object({ question: z.string(), answer: z.enum([...answers, '']) })),
  remark: z.string(),
});
export type ReviewFields = z.infer<typeof reviewSchema>;

export const emptyReview = (questions: readonly string[]): ReviewFields => ({
  answers: questions.map((question) => ({ question, answer: '' })),
  remark: '',
});

/** Places of the questions that are still open. */
export const openQuestions = ({ answers: given }: Pick<ReviewFields, 'answers'>): number[] =>
  given.flatMap(({ answer }, i) => (answer === '' ? [i] : []));

/** What stands in the way of a verdict: approving asks for every answer, returning for a remark. */
export function verdictBlock(verdict: ReviewVerdict, fields: ReviewFields): 'answers' | 'remark' | null {
  if (verdict === 'APPROVE') return openQuestions(fields).length > 0 ? 'answers' : null;
  return fields.remark.trim() === '' ? 'remark' : null;
}

export const reviewInput = (versionId: string, verdict: ReviewVerdict, fields: ReviewFields): RecordReviewInput => ({
  versionId,
  verdict,
  remark: fields.remark.trim(),
  checklist: fields.answers.map(({ question, answer }) => ({ question, answer: answer === '' ? null : answer })),
});

interface OwnedSeries {
  readonly title: string;
  readonly createdBy?: { readonly id: string } | null;
  readonly submittedBy?: { readonly id: string } | null;
}

/** Why a person may not review a version: they prepared it, or own one of its series; null when they may. */
export function conflictOfInterest(
  version: {
    readonly preparedBy?: { readonly id: string } | null;
    readonly fit: { readonly series: readonly OwnedSeries[] };
  },
  personId: string | undefined,
): { readonly kind: 'prepared' } | { readonly kind: 'owns'; readonly series: string } | null {
  if (version.preparedBy?.id === personId) return { kind: 'prepared' };
  const own = version.fit.series.find(
    ({ createdBy, submittedBy }) => createdBy?.id === personId || submittedBy?.id === personId,
  );
  return own ? { kind: 'owns', series: own.title } : null;
}
