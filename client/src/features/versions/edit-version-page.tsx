import { useMutation, useQuery } from '@apollo/client/react';
import { zodResolver } from '@hookform/resolvers/zod';
import { chakra } from '@chakra-ui/react';
import { useState, type ReactNode } from 'react';
import { useForm, type Control } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import {
  type EditedVersionFragment,
  SubmitForReviewDocument,
  UpdateDraftDocument,
  VersionToEditDocument,
} from '../../gql/graphql';
import { errorCode, errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { applyProblems } from '../../lib/form-problems';
import { formatDate } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { versionStrings } from '../../strings/versions';
import { Banner } from '../../ui/feedback/banner';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { Actions, Button, WordButton } from '../../ui/form/button';
import { AreaField, FormError } from '../../ui/form/field';
import { WarnMark } from '../../ui/marks/marks';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening, Section } from '../../ui/page/section';
import { HistoryBlock } from './history-block';
import { PressureRange } from './pressure-range';
import { type SaveOutcome, type SaveState } from './saver';
import { useAutosave } from './use-autosave';
import { draftInput, editSchema, isSection, versionFields, wasReleased, type VersionFields } from './version-words';

const words = versionStrings.edit;
const sheets = { name: versionStrings.path.sheets, to: paths.catalogue() };

export type SheetSectionOf = EditedVersionFragment['content']['sections'][number];
/** Shows one section of the sheet, numbers and all. */
export type RenderSection = (section: SheetSectionOf, version: EditedVersionFragment) => ReactNode;

/** The words of a draft or returned version, beside the numbers of its fit. */
export function EditVersionPage({ id, renderSection }: { readonly id: string; readonly renderSection: RenderSection }) {
  const { data, error, refetch } = useQuery(VersionToEditDocument, {
    variables: { id },
    fetchPolicy: 'network-only',
    nextFetchPolicy: 'cache-first',
  });
  const [loads, setLoads] = useState(0);
  const version = data?.node?.__typename === 'DataSheetVersion' ? data.node : null;
  if (version && (version.status === 'DRAFT' || version.status === 'RETURNED')) {
    const reload = async () => {
      await refetch();
      setLoads(loads + 1);
    };
    return <Editor key={loads} version={version} renderSection={renderSection} onReload={() => void reload()} />;
  }
  const title = version ? fill(words.title, { number: version.number }) : versionStrings.path.edit;
  return (
    <Page
      title={title}
      path={[sheets, { name: title }]}
      folio={version && <StateMark state={stateOf(version.status)} />}
    >
      <Opening small title={title}>
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

interface EditorProps {
  readonly version: EditedVersionFragment;
  readonly renderSection: RenderSection;
  readonly onReload: () => void;
}

function Editor({ version, renderSection, onReload }: EditorProps) {
  const { content, number, sheet } = version;
  const isFirst = wasReleased(sheet.versions.filter(({ id }) => id !== version.id)) === null;
  const form = useForm<VersionFields>({
    resolver: zodResolver(editSchema(isFirst)),
    defaultValues: versionFields(version),
    mode: 'onChange',
  });
  const { state, saveNow } = useAutosave(form, { save: useSave(version.id, form.setError), seen: version.lockVersion });
  const named = fill(versionStrings.path.version, { number });
  return (
    <Page
      title={`${fill(words.title, { number })}, ${content.title}`}
      path={[
        sheets,
        { name: content.title, to: paths.sheet(sheet.code) },
        { name: named, to: paths.version(sheet.code, number) },
        { name: versionStrings.path.edit },
      ]}
      folio={
        <>
          <StateMark state={stateOf(version.status)}>
            {fill(versionStrings.folio, { number, state: stateOf(version.status) })}
          </StateMark>
          <Saved state={state} />
        </>
      }
    >
      <Opening
        small
        title={content.title}
        lead={words.lead}
        margin={<HistoryBlock events={version.events} note={words.numberNote} />}
      >
        <WhyReturned version={version} />
        <SaveTrouble state={state} onReload={onReload} onRetry={() => void saveNow()} />
      </Opening>
      <WordsSection control={form.control} isFirst={isFirst} />
      {content.sections.map((section) => (
        <Beside key={section.id} left={renderSection(section, version)}>
          {isSection(section.id) && <SectionWords control={form.control} name={section.id} title={section.title} />}
          {section.id === 'recommended' && !content.sections.some(({ id }) => id === 'uncertainty') && (
            <SectionWords control={form.control} name="uncertainty" title={words.uncertainty} />
          )}
          {section.id === 'correlation' && <PressureRange form={form} fitted={version.fit.correlation.validity} />}
        </Beside>
      ))}
      <SubmitSection version={version} state={state} saveNow={saveNow} />
    </Page>
  );
}

function useSave(id: string, setError: ReturnType<typeof useForm<VersionFields>>['setError']) {
  const [update] = useMutation(UpdateDraftDocument, { errorPolicy: 'all' });
  return async (fields: VersionFields, lockVersion: number): Promise<SaveOutcome> => {
    const { data, error } = await update({ variables: { input: draftInput({ id, lockVersion }, fields) } });
    if (errorCode(error) === 'CONFLICT') return { kind: 'conflict' };
    if (error) return { kind: 'failed', why: errorMessage(error) };
    const saved = data?.updateDraft.version;
    if (saved) return { kind: 'saved', seen: saved.lockVersion };
    const problems = data?.updateDraft.problems ?? [];
    applyProblems(setError, problems, fieldOf);
    return { kind: 'failed', why: problems.map(({ message }) => message).join(' ') };
  };
}

function fieldOf(path: string) {
  if (path === 'summary' || path === 'changeNote') return path;
  const [, part] = /^pressureRange\.(minimum|maximum|reason)$/.exec(path) ?? [];
  return part === 'minimum' || part === 'maximum' || part === 'reason' ? (`range.${part}` as const) : null;
}

const timeFormat = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });

function Saved({ state }: { readonly state: SaveState }) {
  const { save } = words;
  const text =
    state.kind === 'saved'
      ? state.at === null
        ? save.asLoaded
        : fill(save.saved, { time: timeFormat.format(state.at) })
      : state.kind === 'conflict'
        ? save.failed
        : save[state.kind];
  return <span role="status">{text}</span>;
}

function WhyReturned({ version: { status, events } }: { readonly version: EditedVersionFragment }) {
  const last = events.findLast(({ action }) => action === 'return');
  if (last === undefined || (status !== 'RETURNED' && events.at(-1)?.action !== 'change')) return null;
  return (
    <Banner tone="warning" mark={<StateMark state="returned">{words.returned}</StateMark>}>
      {fill(words.saidBy, { person: last.person.name, date: formatDate(last.at) })} {last.remark}
    </Banner>
  );
}

function SaveTrouble({
  state,
  onReload,
  onRetry,
}: {
  readonly state: SaveState;
  readonly onReload: () => void;
  readonly onRetry: () => void;
}) {
  if (state.kind === 'failed')
    return <Failed what={words.failedWhat} why={`${state.why} ${words.failedWhy}`} onRetry={onRetry} />;
  if (state.kind !== 'conflict') return null;
  return (
    <Banner
      tone="warning"
      live
      mark={
        <chakra.b color="warn">
          <WarnMark />
          {words.conflict}
        </chakra.b>
      }
    >
      {words.conflictWhy} <WordButton onClick={onReload}>{words.reload}</WordButton>
    </Banner>
  );
}

function WordsSection({ control, isFirst }: { readonly control: Control<VersionFields>; readonly isFirst: boolean }) {
  const { draft } = versionStrings;
  return (
    <Section title={words.words} id="words" tight>
      <chakra.div display="grid" gap="16px" maxWidth="640px">
        <AreaField control={control} name="summary" label={draft.summary} hint={draft.summaryHint} />
        {!isFirst && <AreaField control={control} name="changeNote" label={draft.changeNote} />}
      </chakra.div>
    </Section>
  );
}

/** A section of the sheet at the left, without its own margin; the editor's words at the right, level with it. */
const Beside = ({ left, children }: { readonly left: ReactNode; readonly children: ReactNode }) => (
  <chakra.div
    display={{ md: 'grid' }}
    gridTemplateColumns={{ md: 'minmax(0, 1fr) 224px', lg: 'minmax(0, 1fr) 296px' }}
    columnGap={{ md: '32px', lg: '56px' }}
  >
    <chakra.div
      minWidth="0"
      css={{
        '& > section': { gridTemplateColumns: { md: '32px minmax(0, 1fr)', lg: '48px minmax(0, 1fr)' } },
        '& > section > aside': { display: 'none' },
      }}
    >
      {left}
    </chakra.div>
    <chakra.aside paddingTop={{ base: '16px', md: '52px' }} textStyle="margin" color="ink2">
      {children}
    </chakra.aside>
  </chakra.div>
);

function SectionWords({
  control,
  name,
  title,
}: {
  readonly control: Control<VersionFields>;
  readonly name: keyof VersionFields['remarks'];
  readonly title: string;
}) {
  const label =
    name === 'uncertainty' && title === words.uncertainty ? title : fill(words.sectionWords, { section: title });
  return (
    <MarginBlock title={words.yours}>
      <AreaField control={control} name={`remarks.${name}`} label={label} hint={words.sectionHint} rows={4} />
    </MarginBlock>
  );
}

interface SubmitProps {
  readonly version: EditedVersionFragment;
  readonly state: SaveState;
  readonly saveNow: () => Promise<boolean>;
}

function SubmitSection({ version, state, saveNow }: SubmitProps) {
  const navigate = useNavigate();
  const [submit, { loading }] = useMutation(SubmitForReviewDocument, { errorPolicy: 'all' });
  const [refused, setRefused] = useState<string | undefined>();
  const run = async () => {
    if (!(await saveNow())) return setRefused(words.notReady);
    const { data, error } = await submit({ variables: { id: version.id } });
    const outcome = data?.submitForReview;
    if (outcome?.version) return navigate(paths.version(version.sheet.code, outcome.version.number));
    setRefused(error ? errorMessage(error) : outcome?.problems.map(({ message }) => message).join(' '));
  };
  const blocked = state.kind === 'conflict' ? words.conflict : undefined;
  return (
    <Section title={words.submitTitle} id="submit">
      <p>{words.submitNote}</p>
      <Actions>
        <Button kind="primary" busy={loading} waitingFor={blocked} onClick={() => void run()}>
          {loading ? words.submitting : fill(words.submit, { number: version.number })}
        </Button>
        {state.kind === 'dirty' && <WordButton onClick={() => void saveNow()}>{words.save.now}</WordButton>}
        <Link to={paths.version(version.sheet.code, version.number)}>{versionStrings.toSheet}</Link>
      </Actions>
      <FormError message={refused} />
    </Section>
  );
}
