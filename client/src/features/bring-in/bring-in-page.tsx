import { useQuery } from '@apollo/client/react';
import { chakra } from '@chakra-ui/react';
import { useCallback, useEffect, useState } from 'react';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm, type UseFormSetError } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import { BringInPairDocument } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { counted } from '../../lib/counted';
import { applyProblems } from '../../lib/form-problems';
import { HttpProblem } from '../../lib/http';
import { paths } from '../../lib/paths';
import { useRemembered } from '../../lib/remembered';
import { usePerson } from '../../lib/session';
import { bringInStrings } from '../../strings/bring-in';
import { Failed, Loading } from '../../ui/feedback/states';
import { WordButton } from '../../ui/form/button';
import { StateMark } from '../../ui/marks/state-mark';
import { Page } from '../../ui/page/page';
import { Opening } from '../../ui/page/section';
import { numbered, type ReadAnswer } from './answer';
import { type Draft, draftOf, emptyDraft, emptyHeader, type HeaderValues, type SubstanceChoice } from './draft';
import { type Header, headerSchema } from './header-schema';
import { HeaderSection, PairSection } from './header-section';
import { KeepSection, type Missing } from './keep-section';
import { ReadingMargin } from './reading-margin';
import { keepBody } from './requests';
import { TableSection } from './table-section';
import { UnderstoodSection } from './understood-section';
import { useKeeping } from './use-keeping';
import { useReading } from './use-reading';
import { useUpload } from './use-upload';

const words = bringInStrings;
type Pair = readonly [SubstanceChoice, SubstanceChoice];

/** Brings a series in, for a pair that is given or still to be chosen. */
export function BringInPage({ pairId }: { readonly pairId: string | null }) {
  const person = usePerson();
  const { data, error, refetch } = useQuery(BringInPairDocument, {
    variables: { id: pairId ?? '' },
    skip: pairId === null,
  });
  const [first, second] = data?.node?.__typename === 'GasPair' ? data.node.substances : [];
  if (person === null) return null;
  if (pairId === null || (data && !(first && second))) return <BringIn personId={person.id} pair={null} />;
  if (first && second) return <BringIn personId={person.id} pair={[first, second]} />;
  return (
    <Page title={words.title} path={[{ name: words.path.series, to: paths.seriesList() }, { name: words.path.page }]}>
      <Opening small title={words.title}>
        {error ? (
          <Failed what={words.pairFailed} why={errorMessage(error)} onRetry={() => void refetch()} />
        ) : (
          <Loading what={words.pair.title} />
        )}
      </Opening>
    </Page>
  );
}

interface BringInProps {
  readonly personId: string;
  readonly pair: Pair | null;
}

/** The page begins anew when one starts over. */
function BringIn({ personId, pair }: BringInProps) {
  const [beginning, setBeginning] = useState(0);
  const stored = draftOf(personId);
  const startOver = () => {
    stored.set(emptyDraft());
    setBeginning(beginning + 1);
  };
  return <BringInForm key={beginning} personId={personId} pair={pair} onStartOver={startOver} />;
}

function BringInForm({ personId, pair, onStartOver }: BringInProps & { readonly onStartOver: () => void }) {
  const stored = draftOf(personId);
  const draft = useRemembered(stored);
  const form = useForm<HeaderValues, unknown, Header>({
    resolver: zodResolver(headerSchema),
    defaultValues: {
      ...draft.header,
      ...(pair === null ? {} : { first: choiceOf(pair[0]), second: choiceOf(pair[1]) }),
    },
  });
  useEffect(() => {
    stored.set({ ...stored.get(), header: form.getValues() });
    return form.subscribe({
      formState: { values: true },
      callback: ({ values }) => stored.set({ ...stored.get(), header: { ...emptyHeader, ...values } }),
    });
  }, [form, stored]);

  const upload = useUpload((file) => stored.set({ ...emptyReading(stored.get()), way: 'UPLOAD', file }));
  const reading = useReading(draft);
  const navigate = useNavigate();
  const kept = useCallback(
    (seriesId: string) => {
      stored.set(emptyDraft());
      void navigate(paths.series(seriesId));
    },
    [stored, navigate],
  );
  const keeping = useKeeping(draft.importId, kept);
  const { answer } = reading;
  const missing = missingOf({ draft, answer, isStale: reading.isStale, focus: (field) => form.setFocus(field) });
  const submit = form.handleSubmit(({ commonPercent }) => {
    const importId = crypto.randomUUID();
    const body = keepBody(draft, importId, commonPercent);
    if (missing.length > 0 || body === null) return;
    stored.set({ ...draft, importId });
    keeping.keep(body, (error) => showRefusal(form.setError, error));
  });

  return (
    <Page
      title={words.title}
      path={[{ name: words.path.series, to: paths.seriesList() }, { name: words.path.page }]}
      folio={
        <>
          <StateMark state="draft">{words.state.nothing}</StateMark>
          <span>{words.state.typed}</span>
        </>
      }
    >
      <form onSubmit={(event) => void submit(event)} noValidate aria-label={words.title}>
        <Opening
          small
          title={words.title}
          margin={answer && <ReadingMargin draft={draft} onDraft={stored.set} answer={answer} />}
        >
          <Steps current={stepOf(draft, answer)} onStartOver={onStartOver} />
        </Opening>
        <PairSection control={form.control} answer={answer} />
        <TableSection draft={draft} onDraft={stored.set} upload={upload} />
        <UnderstoodSection draft={draft} onDraft={stored.set} reading={reading} />
        <HeaderSection control={form.control} pairIds={[draft.header.first.id, draft.header.second.id]} />
        <KeepSection
          draft={draft}
          answer={answer}
          missing={missing}
          keeping={keeping}
          refusal={form.formState.errors.root?.message}
        />
      </form>
    </Page>
  );
}

const choiceOf = ({ id, name }: SubstanceChoice): SubstanceChoice => ({ id, name });
const emptyReading = (draft: Draft): Draft => ({
  ...draft,
  sheet: null,
  delimiter: null,
  decimal: null,
  mapping: null,
  decisions: {},
});

const FIELD_OF: Readonly<Record<string, keyof HeaderValues>> = {
  a: 'first',
  b: 'second',
  title: 'title',
  source: 'source',
  method: 'method',
  apparatus: 'apparatus',
  commonRelativeUncertainty: 'commonPercent',
  sameDataAsId: 'sameDataAsId',
};

function showRefusal(setError: UseFormSetError<HeaderValues>, error: unknown): void {
  if (error instanceof HttpProblem && error.fields.length > 0)
    applyProblems(setError, error.fields, (path) => FIELD_OF[path] ?? null);
  else setError('root', { type: 'server', message: error instanceof Error ? error.message : '' });
}

interface MissingFacts {
  readonly draft: Draft;
  readonly answer: ReadAnswer | null;
  readonly isStale: boolean;
  readonly focus: (field: keyof HeaderValues) => void;
}

/** Everything that stands in the way of keeping, in the order of the page. */
function missingOf({ draft, answer, isStale, focus }: MissingFacts): Missing[] {
  const header = headerSchema.safeParse(draft.header).error?.issues ?? [];
  const fields = header.map(({ path, message }): Missing => ({
    words: message,
    go: () => focus(path[0] as keyof HeaderValues),
  }));
  const toTable = () => goTo('#table [role=tab][aria-selected=true]');
  if (answer === null) return [...fields, { words: words.missing.table, go: toTable }];
  if (isStale) return [...fields, { words: words.missing.reading, go: toTable }];
  if (answer.isComplete) return fields;
  const open = numbered(answer.issues).find(({ issue }) => issue.decided === null);
  const toDoubt = () => goTo(`#doubt-${open?.number ?? 1} input, #understood select`);
  return [...fields, { words: counted(words.missing.decisions, answer.openCount), go: toDoubt }];
}

function goTo(selector: string): void {
  document.querySelector<HTMLElement>(selector)?.focus();
}

function stepOf(draft: Draft, answer: ReadAnswer | null): number {
  if (answer === null) return 0;
  if (!answer.isComplete) return 1;
  return headerSchema.safeParse(draft.header).success ? 3 : 2;
}

/** Where one stands. */
function Steps({ current, onStartOver }: { readonly current: number; readonly onStartOver: () => void }) {
  const { label, table, understand, describe, keep } = words.steps;
  return (
    <chakra.div display="flex" flexWrap="wrap" gap="6px 30px" textStyle="small" marginTop="18px" alignItems="baseline">
      <chakra.ol display="flex" flexWrap="wrap" gap="6px 30px" listStyle="none" color="ink2" aria-label={label}>
        {[table, understand, describe, keep].map((step, i) => (
          <chakra.li
            key={step}
            {...(i === current
              ? {
                  'aria-current': 'step',
                  color: 'ink',
                  fontWeight: 600,
                  borderBottom: '2px solid',
                  borderColor: 'accent',
                }
              : {})}
            {...(i < current ? { color: 'ink' } : {})}
          >
            <chakra.span color="ink3" fontWeight={400} marginRight="8px" fontFeatureSettings='"tnum"'>
              {i + 1}
            </chakra.span>
            {step}
          </chakra.li>
        ))}
      </chakra.ol>
      <WordButton quiet onClick={onStartOver}>
        {words.startOver}
      </WordButton>
    </chakra.div>
  );
}
