import { useMutation } from '@apollo/client/react';
import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { type FitCorrelationInput, KeepFitDocument, type KeptFitFragment, WorkspaceDocument } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { paths } from '../../lib/paths';
import { hasRole, usePerson } from '../../lib/session';
import { fitStrings } from '../../strings/fits';
import { Failed } from '../../ui/feedback/states';
import { Actions, Button, ButtonLink, WordButton } from '../../ui/form/button';
import { FormError } from '../../ui/form/field';
import { MarginBlock } from '../../ui/page/margin-block';
import { type Choice, type ChoiceAction } from './choice';
import { type PairSeries } from './pair-series';
import { RecipeForm } from './recipe-form';
import { Fading, ResultBlock } from './result-block';
import { asSentence, doubt } from './statements';
import { type Preview } from './use-preview';
import { MarginStatements } from './warnings';
import { type Pair } from './workspace-pair';

const words = fitStrings.recipe;

interface RecipeMarginProps {
  readonly pair: Pair;
  readonly choice: Choice;
  readonly input: FitCorrelationInput | null;
  readonly preview: Preview;
  /** The kept fit that this choice is, or null. */
  readonly kept: KeptFitFragment | null;
  readonly series: readonly PairSeries[];
  readonly dispatch: (action: ChoiceAction) => void;
  readonly forget: () => void;
}

/** The recipe, what came of it, what is doubtful in it, and keeping it. */
export function RecipeMargin({ pair, choice, input, preview, kept, series, dispatch, forget }: RecipeMarginProps) {
  const { analysis } = preview;
  const accepted = series.filter(({ status }) => status === 'ACCEPTED');
  const pointCount = accepted.reduce((sum, one) => sum + one.points.length, 0);
  return (
    <>
      <MarginBlock title={words.title}>
        <RecipeForm
          recipe={choice.recipe}
          onChange={(recipe) => {
            if (JSON.stringify(recipe) !== JSON.stringify(choice.recipe)) dispatch({ type: 'recipe', recipe });
          }}
        />
        <Problems preview={preview} />
        <Keep pair={pair} input={input} kept={kept} ready={preview.isCurrent} forget={forget} />
      </MarginBlock>
      {analysis !== null && <ResultBlock analysis={analysis} pointCount={pointCount} stale={!preview.isCurrent} />}
      {analysis !== null && (
        <MarginBlock title={fitStrings.result.inWords}>
          <Fading stale={!preview.isCurrent}>
            {analysis.warnings.length === 0 ? (
              <p>{fitStrings.result.noWarnings}</p>
            ) : (
              <MarginStatements statements={analysis.warnings.map(doubt)} />
            )}
          </Fading>
        </MarginBlock>
      )}
    </>
  );
}

/** Why there is no fit, in words, beside the recipe. */
function Problems({ preview: { problems, error, analysis, retry } }: { readonly preview: Preview }) {
  const kept = analysis === null ? '' : ` ${words.lastGood}`;
  if (error) return <Failed what={words.problems} why={errorMessage(error) + kept} onRetry={retry} />;
  if (problems.length === 0) return null;
  const why = problems.map(({ message }) => asSentence(message)).join(' ');
  return <Failed what={words.problems} why={why + kept} />;
}

interface KeepProps {
  readonly pair: Pair;
  readonly input: FitCorrelationInput | null;
  readonly kept: KeptFitFragment | null;
  readonly ready: boolean;
  readonly forget: () => void;
}

function Keep({ pair, input, kept, ready, forget }: KeepProps) {
  const mayDraft = hasRole(usePerson(), 'EDITOR');
  const newest = pair.fits[0] ?? null;
  const [keep, { loading, data, error }] = useMutation(KeepFitDocument, {
    refetchQueries: [WorkspaceDocument],
    awaitRefetchQueries: true,
    errorPolicy: 'all',
  });
  const refused =
    data?.fitCorrelation.problems.map(({ message }) => asSentence(message)).join(' ') ||
    (error ? errorMessage(error) : undefined);
  const run = async () => {
    if (input === null) return;
    const answer = await keep({ variables: { input } });
    if (answer.data?.fitCorrelation.fit) forget();
  };
  if (kept !== null) {
    return (
      <>
        <chakra.p marginTop="12px">
          <Link to={paths.fit(kept.id)}>{fill(words.isKept, { number: kept.number })}</Link>
        </chakra.p>
        {mayDraft && (
          <Actions>
            <ButtonLink kind="primary" to={paths.draftVersion(kept.id)}>
              {fill(words.draft, { number: kept.number })}
            </ButtonLink>
          </Actions>
        )}
      </>
    );
  }
  const number = (newest?.number ?? 0) + 1;
  return (
    <>
      <Actions>
        <Button
          kind="primary"
          busy={loading}
          waitingFor={ready || loading ? undefined : words.notYet}
          onClick={() => void run()}
        >
          {loading ? words.keeping : fill(words.keep, { number })}
        </Button>
        <WordButton onClick={forget}>
          {newest === null ? words.restart : fill(words.back, { number: newest.number })}
        </WordButton>
      </Actions>
      <FormError message={refused} />
    </>
  );
}
