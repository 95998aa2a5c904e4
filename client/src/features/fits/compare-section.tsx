import { skipToken, useQuery } from '@apollo/client/react';
import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useMemo, useState } from 'react';
import { Link } from 'react-router-dom';
import { CompareFitsDocument, type KeptFitFragment } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { formatShort, formatShortDate } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { hasRole, usePerson } from '../../lib/session';
import { useReaderUnits } from '../../lib/units';
import { fitStrings } from '../../strings/fits';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { Figure } from '../../ui/figure/figure';
import { Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Section } from '../../ui/page/section';
import { viewsRecipe } from '../../ui/recipes/control.recipe';
import { compareFigure, compareTable, fitName } from './compare-figure';
import { commonRange, largestDifference, type Compared } from './compare-rows';
import { CompareTable } from './compare-table';
import { temperaturesAlong } from './figure-ranges';

const words = fitStrings.compare;
const MOST = 4;

interface CompareSectionProps {
  readonly number?: number;
  /** Newest first. */
  readonly fits: readonly KeptFitFragment[];
  readonly pairId: string;
  /** Chosen at first; the two newest when absent. */
  readonly initial?: readonly string[];
  readonly own?: boolean;
}

/** Kept fits side by side, two to four. */
export function CompareSection({ number, fits, pairId, initial, own = false }: CompareSectionProps) {
  const [chosen, setChosen] = useState<readonly string[] | null>(initial ?? null);
  const ids = (chosen ?? fits.slice(0, 2).map(({ id }) => id)).filter((id) => fits.some((fit) => fit.id === id));
  const shown = fits.filter(({ id }) => ids.includes(id)).reverse();
  const toggle = (id: string) =>
    setChosen(ids.includes(id) ? ids.filter((other) => other !== id) : [...ids, id].slice(-MOST));
  const mayDraft = hasRole(usePerson(), 'EDITOR');
  return (
    <Section
      {...(number === undefined ? {} : { number })}
      title={words.title}
      id="side-by-side"
      margin={
        fits.length > 0 && (
          <>
            <MarginBlock
              title={words.list}
              kind="files"
              entries={fits.slice(0, 8).map((fit) => [
                <Link key={fit.id} to={paths.fit(fit.id)}>
                  {fill(fitStrings.fitTitle, { number: fit.number })}
                </Link>,
                fill(words.madeBy, { person: fit.createdBy?.name ?? '', date: formatShortDate(fit.createdAt) }),
              ])}
            />
            <MarginBlock>
              {mayDraft &&
                shown.map((fit) => (
                  <p key={fit.id}>
                    <Link to={paths.draftVersion(fit.id)}>{fill(words.draft, { number: fit.number })}</Link>
                  </p>
                ))}
              {!own && shown.length > 1 && (
                <p>
                  <Link to={paths.compareFits(shown.map(({ id }) => id))}>{words.page}</Link>
                </p>
              )}
            </MarginBlock>
          </>
        )
      }
    >
      {fits.length < 2 ? <Empty sentence={words.none} /> : <Chooser fits={fits} chosen={ids} onToggle={toggle} />}
      {shown.length >= 2 && <SideBySide key={ids.join()} fits={shown} pairId={pairId} />}
    </Section>
  );
}

function Chooser({
  fits,
  chosen,
  onToggle,
}: {
  readonly fits: readonly KeptFitFragment[];
  readonly chosen: readonly string[];
  readonly onToggle: (id: string) => void;
}) {
  const styles = useSlotRecipe({ recipe: viewsRecipe })({ kind: 'filters' });
  return (
    <chakra.div css={styles.root} role="group" aria-label={words.choose}>
      <chakra.span css={styles.label} aria-hidden>
        {words.choose}
      </chakra.span>
      {fits.map((fit) => (
        <chakra.button
          key={fit.id}
          type="button"
          css={styles.option}
          aria-pressed={chosen.includes(fit.id)}
          onClick={() => onToggle(fit.id)}
        >
          {fill(fitStrings.fit, { number: fit.number })}
        </chakra.button>
      ))}
      <chakra.span css={styles.label}>{words.most}</chakra.span>
    </chakra.div>
  );
}

const CURVE_POINTS = 61;

function SideBySide({ fits, pairId }: { readonly fits: readonly KeptFitFragment[]; readonly pairId: string }) {
  const common = useMemo(() => commonRange(fits), [fits]);
  const { temperatures, at, pressure } = useMemo(() => states(fits, common), [fits, common]);
  const ids = fits.map(({ id }) => id);
  const [first = '', second = ''] = ids;
  const variables = {
    first,
    second,
    third: ids[2] ?? first,
    fourth: ids[3] ?? first,
    hasThird: ids.length > 2,
    hasFourth: ids.length > 3,
    temperatures,
    pressure: [pressure],
  };
  const { data, error, refetch } = useQuery(CompareFitsDocument, fits.length < 2 ? skipToken : { variables });
  const compared = useMemo(() => {
    const answers = [data?.first, data?.second, data?.third, data?.fourth];
    return fits.flatMap((fit): Compared[] => {
      const found = answers.find((answer) => answer?.id === fit.id);
      return found ? [{ fit, temperatures, ...found.correlation.evaluate }] : [];
    });
  }, [data, fits, temperatures]);
  if (error) return <Failed what={fitStrings.failed.fit} why={errorMessage(error)} onRetry={() => void refetch()} />;
  const [reference, ...others] = compared;
  if (reference === undefined || others.length === 0) return <Loading what={fitStrings.what.comparison} />;
  return <Sides compared={[reference, ...others]} common={common} at={at} pressure={pressure} pairId={pairId} />;
}

interface SidesProps {
  readonly compared: readonly [Compared, ...Compared[]];
  readonly common: { readonly low: number; readonly high: number } | null;
  readonly at: readonly number[];
  readonly pressure: number;
  readonly pairId: string;
}

function Sides({ compared, common, at, pressure, pairId }: SidesProps) {
  const units = useReaderUnits();
  const spec = useMemo(() => compareFigure(compared, common, units), [compared, common, units]);
  const data = useMemo(() => compareTable(compared, units), [compared, units]);
  const [first, ...others] = compared;
  const names = { first: fitName(first), others: others.map(fitName).join(', ') };
  const verdict = common === null ? null : largestDifference(compared, common);
  return (
    <>
      {verdict !== null && (
        <chakra.p textStyle="small" color="ink2" marginTop="8px">
          {fill(verdict.covered ? words.agree : words.differ, { percent: formatShort(100 * verdict.largest, 2) })}
        </chakra.p>
      )}
      <chakra.div
        display="grid"
        gridTemplateColumns={{
          base: 'minmax(0, 1fr)',
          lg: compared.length > 2 ? 'minmax(0, 1fr)' : '460px minmax(0, 1fr)',
        }}
        gap="8px 36px"
        marginTop="10px"
        alignItems="start"
      >
        <CompareTable compared={compared} at={at} pressure={pressure} file={`fits-${pairId.slice(0, 8)}`} />
        <Figure
          number={2}
          caption={<Typeset values={names}>{words.figure}</Typeset>}
          description={fill(words.description, names)}
          spec={spec}
          data={data}
          file="fits-side-by-side"
          reading={() => null}
        />
      </chakra.div>
    </>
  );
}

/** Along the range of all the fits together, with the ends of the common range and T0 of the first among them. */
function states(fits: readonly KeptFitFragment[], common: { readonly low: number; readonly high: number } | null) {
  const validities = fits.map(({ correlation }) => correlation.validity);
  const min = Math.min(...validities.map(({ temperatureMinimum }) => temperatureMinimum));
  const max = Math.max(...validities.map(({ temperatureMaximum }) => temperatureMaximum));
  const [first] = fits;
  const reference = first?.correlation.referenceTemperature ?? 298.15;
  const pressure = first?.correlation.referencePressure ?? 101_325;
  const at = [...new Set([common?.low ?? min, reference, common?.high ?? max])].sort((a, b) => a - b);
  const within = temperaturesAlong({ min, max }, CURVE_POINTS);
  return { temperatures: [...new Set([...within, ...at])].sort((a, b) => a - b), at, pressure };
}
