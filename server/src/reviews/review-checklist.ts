/** What a reviewer goes through; the page asks for every answer, the record shows those that are missing. */
export const REVIEW_QUESTIONS = [
  'Are the substances and the definition of D right?',
  'Does every series name its source, and does it say what the source says?',
  'Does every exclusion have a reason that holds whatever the result?',
  'Do the parameters and their covariance come out again when the fit is reproduced?',
  'Do the residuals look like scatter against T, against P and by series?',
  'Is the range in T and in P no wider than the measurements and the theory carry?',
  'Is the expanded uncertainty one that you would stand behind?',
  'Do the estimates of kinetic theory agree, or is it said why they do not?',
  'Are the cautions those a reader of this sheet needs?',
] as const;

/** Answers a reviewer may give. */
export const REVIEW_ANSWERS = ['yes', 'no', 'does not apply'] as const;
