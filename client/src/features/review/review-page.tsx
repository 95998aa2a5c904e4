import { useMutation, useQuery } from '@apollo/client/react';
import { zodResolver } from '@hookform/resolvers/zod';
import { chakra } from '@chakra-ui/react';
import { Fragment, useState, type ReactNode } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import {
  RecordReviewDocument,
  type ReviewedVersionFragment,
  type ReviewVerdict,
  VersionToReviewDocument,
} from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { counted } from '../../lib/counted';
import { fill } from '../../lib/fill';
import { formatDate, formatShortDate } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { usePerson } from '../../lib/session';
import { versionStrings } from '../../strings/versions';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { AnswerField } from '../../ui/form/answer-field';
import { Actions, Button, WordButton } from '../../ui/form/button';
import { AreaField, FormError } from '../../ui/form/field';
import { TickMark } from '../../ui/marks/marks';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { Runs } from '../../ui/numbers/typeset';
import { Page } from '../../ui/page/page';
import { Opening } from '../../ui/page/section';
import { ReproductionSection } from './reproduction-section';
import {
  answers,
  conflictOfInterest,
  emptyReview,
  openQuestions,
  reviewInput,
  reviewSchema,
  verdictBlock,
  type ReviewFields,
} from './review-form';

const words = versionStrings.review;
const sheets = { name: versionStrings.path.sheets, to: paths.catalogue() };

export type ReviewedSection = ReviewedVersionFragment['content']['sections'][number];
export type RenderReviewed = (section: ReviewedSection, version: ReviewedVersionFragment) => ReactNode;

/** A version in review: the sheet at the left, the reviewer's work at the right. */
export function ReviewPage({ id, renderSection }: { readonly id: string; readonly renderSection: RenderReviewed }) {
  const { data, error, refetch } = useQuery(VersionToReviewDocument, {
    variables: { id },
    fetchPolicy: 'network-only',
    nextFetchPolicy: 'cache-first',
  });
  const version = data?.node?.__typename === 'DataSheetVersion' ? data.node : null;
  if (version?.status === 'IN_REVIEW' || version?.status === 'APPROVED') {
    return <Review version={version} questions={data?.reviewQuestions ?? []} renderSection={renderSection} />;
  }
  const title = versionStrings.path.review;
  return (
    <Page
      title={title}
      path={[sheets, { name: title }]}
      folio={version && <StateMark state={stateOf(version.status)} />}
    >
      <Opening small title={version?.content.title ?? title}>
        {error && <Failed what={versionStrings.failed} why={errorMessage(error)} onRetry={() => void refetch()} />}
        {!error && !data && <Loading what={versionStrings.what} />}
        {data && !version && <Empty sentence={versionStrings.missing} />}
        {version && (
          <Empty sentence={fill(versionStrings.closed, { state: stateOf(version.status), cannot: words.cannot })}>
            <Link to={paths.version(version.sheet.code, version.number)}>{versionStrings.toSheet}</Link>
          </Empty>
        )}
      </Opening>
    </Page>
  );
}

interface ReviewProps {
  readonly version: ReviewedVersionFragment;
  readonly questions: readonly string[];
  readonly renderSection: RenderReviewed;
}

function Review({ version, questions, renderSection }: ReviewProps) {
  const { content, number, sheet } = version;
  const named = fill(versionStrings.path.version, { number });
  return (
    <Page
      title={fill(words.title, { title: content.title, number })}
      path={[
        sheets,
        { name: content.title, to: paths.sheet(sheet.code) },
        { name: named, to: paths.version(sheet.code, number) },
        { name: versionStrings.path.review },
      ]}
      folio={
        <>
          <StateMark state={stateOf(version.status)}>
            {fill(versionStrings.folio, { number, state: stateOf(version.status) })}
          </StateMark>
          <span>{formatDate(version.updatedAt)}</span>
        </>
      }
    >
      <chakra.div
        display={{ md: 'grid' }}
        gridTemplateColumns={{ md: 'minmax(0, 1fr) 348px', lg: 'minmax(0, 748px) minmax(0, 484px)' }}
        columnGap={{ md: '36px', lg: '64px' }}
      >
        <chakra.div minWidth="0" css={SHEET}>
          <Opening small title={content.title} lead={<Runs runs={content.lead} />}>
            <p>{content.summary}</p>
            {version.changeNote && <p>{version.changeNote}</p>}
          </Opening>
          {content.sections.map((section) => (
            <Fragment key={section.id}>{renderSection(section, version)}</Fragment>
          ))}
        </chakra.div>
        <chakra.div minWidth="0" paddingTop={{ base: '36px', md: '40px' }}>
          <Work version={version} questions={questions} />
        </chakra.div>
      </chakra.div>
    </Page>
  );
}

/** The sheet without its margins: the place at the right is the reviewer's. */
const SHEET = {
  '& section': { gridTemplateColumns: { md: '32px minmax(0, 1fr)', lg: '48px minmax(0, 1fr)' } },
  '& section > aside': { display: 'none' },
};

/** Checklist, reproduction, verdict. */
function Work({ version, questions }: Omit<ReviewProps, 'renderSection'>) {
  const person = usePerson();
  const conflict = conflictOfInterest(version, person?.id);
  const form = useForm<ReviewFields>({ resolver: zodResolver(reviewSchema), defaultValues: emptyReview(questions) });
  const given = useWatch({ control: form.control });
  const fields = { ...emptyReview(questions), ...given } as ReviewFields;
  const open = openQuestions(fields);
  return (
    <>
      <Heading>{words.checklist}</Heading>
      <chakra.p textStyle="caption" color="ink2">
        {fill(words.answered, { n: questions.length - open.length, all: questions.length })}{' '}
        {conflict === null && words.independent}
      </chakra.p>
      <chakra.ol listStyle="none" marginTop="8px">
        {questions.map((question, i) => (
          <chakra.li
            key={question}
            id={`question-${i}`}
            borderTop="1px solid"
            borderColor={i === 0 ? 'ink' : 'rule'}
            padding="8px 0 6px"
            display="grid"
            gridTemplateColumns="24px minmax(0, 1fr)"
          >
            <chakra.span paddingTop="2px">{fields.answers[i]?.answer === '' ? <OpenBox /> : <TickMark />}</chakra.span>
            <AnswerField
              control={form.control}
              name={`answers.${i}.answer`}
              label={question}
              choices={answers.map((answer) => ({ value: answer, label: words.answers[answer] }))}
            />
          </chakra.li>
        ))}
      </chakra.ol>
      <Heading>{words.reproduction}</Heading>
      <ReproductionSection versionId={version.id} file={`${version.sheet.code}-${version.number}`} />
      <Earlier version={version} />
      <Verdict version={version} form={form} fields={fields} conflict={conflict} />
    </>
  );
}

const Heading = ({ children }: { readonly children: ReactNode }) => (
  <chakra.h2 textStyle="section" marginTop="32px" _first={{ marginTop: 0 }}>
    {children}
  </chakra.h2>
);

const OpenBox = () => (
  <chakra.span
    aria-hidden
    display="inline-block"
    width="11px"
    height="11px"
    border="1.2px solid"
    borderColor="control"
  />
);

function Earlier({ version: { reviews } }: { readonly version: ReviewedVersionFragment }) {
  if (reviews.length === 0) return null;
  return (
    <>
      <Heading>{words.earlier}</Heading>
      <chakra.ul listStyle="none" textStyle="small" marginTop="6px">
        {reviews.map((review) => (
          <chakra.li key={review.createdAt} borderTop="1px solid" borderColor="rule" padding="8px 0">
            {review.remark}
            <chakra.span display="block" color="ink2" fontSize="13px">
              {`${review.reviewer.name}, ${formatShortDate(review.createdAt)}, ${review.verdict === 'APPROVE' ? words.approved : words.returned}`}
            </chakra.span>
          </chakra.li>
        ))}
      </chakra.ul>
    </>
  );
}

interface VerdictProps {
  readonly version: ReviewedVersionFragment;
  readonly form: ReturnType<typeof useForm<ReviewFields>>;
  readonly fields: ReviewFields;
  readonly conflict: ReturnType<typeof conflictOfInterest>;
}

function Verdict({ version, form, fields, conflict }: VerdictProps) {
  const { number, content, sheet } = version;
  const navigate = useNavigate();
  const [running, setRunning] = useState<ReviewVerdict | null>(null);
  const [record] = useMutation(RecordReviewDocument, { errorPolicy: 'all' });
  const give = async (verdict: ReviewVerdict) => {
    if (verdictBlock(verdict, fields) === 'remark')
      return form.setError('remark', { message: words.needsRemark }, { shouldFocus: true });
    setRunning(verdict);
    const { data, error } = await record({ variables: { input: reviewInput(version.id, verdict, fields) } });
    setRunning(null);
    const outcome = data?.recordReview;
    if (outcome?.version) return navigate(paths.version(sheet.code, outcome.version.number));
    form.setError('root', {
      message: error
        ? errorMessage(error)
        : outcome?.problems.map(({ message }) => message).join(' ') || words.conflict,
    });
  };
  const mention = (section: ReviewedSection) => {
    const before = form.getValues('remark').trimEnd();
    const start = fill(words.sectionStart, { number: section.number, title: section.title });
    form.setValue('remark', before === '' ? start : `${before}\n${start}`, { shouldDirty: true });
    form.setFocus('remark');
  };
  const waiting = conflict === null ? <Missing fields={fields} /> : <Conflict conflict={conflict} />;
  const approvable = conflict === null && version.status === 'IN_REVIEW' && verdictBlock('APPROVE', fields) === null;
  return (
    <chakra.div borderTop="1.5px solid" borderColor="ink" marginTop="36px" paddingTop="12px">
      <chakra.h3 textStyle="subsection">{fill(words.verdict, { number })}</chakra.h3>
      <chakra.div marginTop="8px">
        <AreaField control={form.control} name="remark" label={words.remark} hint={words.remarkHint} rows={5} />
      </chakra.div>
      <chakra.p textStyle="caption" color="ink2" marginTop="4px">
        {words.onSection}{' '}
        {content.sections.map((section) => (
          <chakra.span key={section.id} marginRight="12px">
            <WordButton
              quiet
              aria-label={`${words.onSection} ${section.number}, ${section.title}`}
              onClick={() => mention(section)}
            >
              {section.number}
            </WordButton>
          </chakra.span>
        ))}
      </chakra.p>
      <FormError message={form.formState.errors.root?.message} />
      <Actions>
        {version.status === 'IN_REVIEW' && (
          <Button
            kind="primary"
            busy={running === 'APPROVE'}
            waitingFor={approvable ? undefined : waiting}
            onClick={() => void give('APPROVE')}
          >
            {running === 'APPROVE' ? words.approving : fill(words.approve, { number })}
          </Button>
        )}
        {conflict === null && (
          <Button busy={running === 'RETURN'} onClick={() => void give('RETURN')}>
            {running === 'RETURN' ? words.returning : words.return}
          </Button>
        )}
      </Actions>
    </chakra.div>
  );
}

/** What is missing before approval, and the way to it. */
function Missing({ fields }: { readonly fields: ReviewFields }) {
  const open = openQuestions(fields);
  const show = () => {
    const question = document.getElementById(`question-${open[0]}`);
    question?.scrollIntoView({ block: 'center' });
    question?.querySelector('input')?.focus();
  };
  return (
    <>
      {counted(words.missing, open.length)} <WordButton onClick={show}>{words.open}</WordButton>
    </>
  );
}

const Conflict = ({ conflict }: { readonly conflict: NonNullable<VerdictProps['conflict']> }) => (
  <>{conflict.kind === 'prepared' ? words.own : fill(words.owner, { series: conflict.series })}</>
);
