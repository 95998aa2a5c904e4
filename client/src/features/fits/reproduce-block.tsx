import { useLazyQuery } from '@apollo/client/react';
import { ReproduceFitDocument, type FitSeriesFragment } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fitStrings } from '../../strings/fits';
import { Failed, Progress } from '../../ui/feedback/states';
import { Actions, Button } from '../../ui/form/button';
import { TickMark, WarnMark } from '../../ui/marks/marks';
import { MarginBlock } from '../../ui/page/margin-block';
import { choiceOfFit, fitInput } from './choice';
import { type DetailedFit } from './detailed-fit';
import { compareParameters } from './reproduction';

const words = fitStrings.fitPage;

/** Computes the fit again from the stored points with the stored choices. */
export function ReproduceBlock({
  fit,
  all,
}: {
  readonly fit: DetailedFit;
  readonly all: readonly FitSeriesFragment[];
}) {
  const [reproduce, { data, loading, error, called }] = useLazyQuery(ReproduceFitDocument, {
    fetchPolicy: 'network-only',
  });
  const choice = fitInput(choiceOfFit(fit), fit.pair.id, all);
  // All of its series by name: one retired since must not silently be left away.
  const input = choice && { ...choice, seriesIds: fit.series.map(({ id }) => id) };
  const answer = data?.previewFit;
  const compared = answer?.analysis
    ? compareParameters(fit.correlation.parameters, answer.analysis.correlation.parameters)
    : null;
  const agrees = compared?.every((row) => row.agrees) ?? false;
  return (
    <MarginBlock title={words.reproduce}>
      <p>{words.reproduceNote}</p>
      <Actions>
        <Button size="small" busy={loading} onClick={() => input && void reproduce({ variables: { input } })}>
          {words.reproduce}
        </Button>
      </Actions>
      <div role="status">
        {loading && <Progress label={words.reproducing} share={null} />}
        {called && !loading && compared !== null && (
          <p>
            {agrees ? <TickMark /> : <WarnMark />}
            {agrees ? words.reproduced : words.notReproduced}
          </p>
        )}
      </div>
      {error && <Failed what={words.notReproduced} why={errorMessage(error)} />}
      {answer && answer.problems.length > 0 && (
        <Failed what={words.notReproduced} why={answer.problems.map(({ message }) => message).join(' ')} />
      )}
    </MarginBlock>
  );
}
