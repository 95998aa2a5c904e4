import { chakra } from '@chakra-ui/react';
import { useMutation } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { type SeriesDetailFragment } from '../../gql/graphql';
import { downloadFile } from '../../lib/download';
import { formatDate, formatShort, formatShortDate, withUnit } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { seriesStrings } from '../../strings/series';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { Typeset } from '../../ui/numbers/typeset';
import { WordButton } from '../../ui/form/button';
import { MarginBlock } from '../../ui/page/margin-block';

/** Enough to tell two files apart at a glance. */
const SHA_DIGITS = 16;

const words = seriesStrings.margin;
interface Props {
  readonly series: SeriesDetailFragment;
}

export const StateBlock = ({ series }: Props) => (
  <MarginBlock
    entries={[
      [words.state, <StateMark key="state" state={stateOf(series.status)} />],
      [words.by, series.createdBy?.name],
      [words.on, formatDate(series.createdAt)],
      [words.submitted, series.submittedBy?.name],
    ]}
  >
    <p>
      <Link to={paths.pair(series.pair.id)}>{words.workspace}</Link>
    </p>
  </MarginBlock>
);

export const ProvenanceBlock = ({ series }: Props) => (
  <MarginBlock
    title={words.from}
    entries={[
      [words.source, series.source],
      [words.method, series.method],
      [words.apparatus, series.apparatus],
      [words.origin, seriesStrings.origins[series.dataOrigin]],
      [
        <Typeset key="common">{words.common}</Typeset>,
        series.commonRelativeUncertainty == null
          ? null
          : withUnit(formatShort(100 * series.commonRelativeUncertainty, 3), '%'),
      ],
      [
        words.sameData,
        series.sameDataAs && (
          <Link key="same" to={paths.series(series.sameDataAs.id)}>
            {series.sameDataAs.title}
          </Link>
        ),
      ],
      [words.file, series.file ? <OriginalFile key="file" file={series.file} /> : words.noFile],
      [words.sha, series.file?.sha256.slice(0, SHA_DIGITS)],
    ]}
  />
);

/** Saves the file the series was read from, as it was brought. */
function OriginalFile({ file: { id, name } }: { readonly file: NonNullable<SeriesDetailFragment['file']> }) {
  const download = useMutation({ mutationFn: () => downloadFile(`/api/files/${id}`, name) });
  return (
    <>
      <WordButton onClick={() => download.mutate()}>{words.download.replace('{name}', () => name)}</WordButton>
      {download.isError && <chakra.span role="alert">{` ${words.fileFailed}`}</chakra.span>}
    </>
  );
}

/** Who did what, newest first. */
export function HistoryBlock({ series: { events } }: Props) {
  const actions: Readonly<Record<string, string>> = seriesStrings.actions;
  return (
    <MarginBlock title={words.whatHappened}>
      <chakra.ol listStyle="none">
        {[...events].reverse().map((event) => (
          <chakra.li key={`${event.at} ${event.action}`} marginTop="5px">
            <chakra.span color="ink">{`${formatShortDate(event.at)}, ${actions[event.action] ?? event.action}`}</chakra.span>
            {` by ${event.person.name}`}
            {event.remark && <chakra.span display="block">{event.remark}</chakra.span>}
          </chakra.li>
        ))}
      </chakra.ol>
    </MarginBlock>
  );
}
