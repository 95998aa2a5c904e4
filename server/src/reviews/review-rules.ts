/** What of a review decides whether it still counts. */
interface Verdict {
  readonly verdict: 'APPROVE' | 'RETURN';
}

/**
 * The approvals that count: those since the version was last returned. What was approved before was changed since.
 *
 * @param reviews of one version, oldest first
 */
export function approvalsInForce<R extends Verdict>(reviews: readonly R[]): R[] {
  const lastReturn = reviews.findLastIndex((review) => review.verdict === 'RETURN');
  return reviews.slice(lastReturn + 1);
}
