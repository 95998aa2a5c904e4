import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useState, type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { fill } from '../../lib/fill';
import { formatNumber, formatSigned } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { fromSi, unitLabel, useReaderUnits, type ReaderUnits } from '../../lib/units';
import { fitStrings } from '../../strings/fits';
import { WordButton } from '../../ui/form/button';
import { DotPlot } from '../../ui/marks/dot-plot';
import { SeriesKey } from '../../ui/marks/series-key';
import { Typeset } from '../../ui/numbers/typeset';
import { Section } from '../../ui/page/section';
import { ledgerRecipe } from '../../ui/recipes/table.recipe';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { type ChoiceAction } from './choice';
import { type PairSeries } from './pair-series';
import { ReasonForm } from './reason-form';
import { parseReason } from './reasons';

const words = fitStrings.ledger;

interface LedgerSectionProps {
  readonly series: readonly PairSeries[];
  /** Half-width of the tint, relative: one new laboratory’s interval at the reference, or null. */
  readonly tint: number | null;
  readonly dispatch: (action: ChoiceAction) => void;
  readonly margin: ReactNode;
  readonly children?: ReactNode;
}

/** The series of the pair: in or out by their own shape, their offsets, and why they are out. */
export function LedgerSection({ series, tint, dispatch, margin, children }: LedgerSectionProps) {
  const styles = useSlotRecipe({ recipe: ledgerRecipe })();
  const units = useReaderUnits();
  const [asking, setAsking] = useState<string | null>(null);
  const toggle = (row: PairSeries) => {
    if (row.carriesWeight) setAsking(row.id);
    else dispatch({ type: 'takeInSeries', id: row.id });
  };
  const act = (row: PairSeries, key: string): boolean => {
    if (key === ' ') toggle(row);
    else if (key.toLowerCase() === 'r') setAsking(row.id);
    else return false;
    return true;
  };
  const rows = series.filter(({ status }) => status === 'ACCEPTED');
  return (
    <Section number={2} title={words.title} id="ledger" margin={margin}>
      <chakra.div css={styles.root}>
        <DataTable
          label={words.title}
          columns={columnsOf(units, tint, toggle)}
          rows={rows}
          rowId={(row) => row.id}
          file="ledger-of-series"
          filterable={false}
          empty={words.empty}
          onKey={act}
          secondLine={(row) =>
            asking === row.id ? (
              <ReasonForm
                title={fill(fitStrings.reason.seriesTitle, { series: row.letter })}
                given={row.reason}
                onCancel={() => setAsking(null)}
                onGive={(reason) => {
                  dispatch({ type: 'leaveOutSeries', id: row.id, reason });
                  setAsking(null);
                }}
              />
            ) : (
              row.reason !== null && <ReasonLine reason={row.reason} onChange={() => setAsking(row.id)} />
            )
          }
        />
      </chakra.div>
      {children}
    </Section>
  );
}

function ReasonLine({ reason, onChange }: { readonly reason: string; readonly onChange: () => void }) {
  const styles = useSlotRecipe({ recipe: ledgerRecipe })();
  const { code, words: why } = parseReason(reason);
  return (
    <chakra.div css={styles.reason} paddingLeft={{ base: 0, md: '66px' }} paddingBottom="4px">
      {code !== null && <b>{fitStrings.reason.codes[code]}</b>}
      {why} <WordButton onClick={onChange}>{words.change}</WordButton>
    </chakra.div>
  );
}

const SCALE = 0.1;
const percent = (relative: number, places: number) => formatNumber(100 * relative, places);

function columnsOf(
  units: ReaderUnits,
  tint: number | null,
  toggle: (row: PairSeries) => void,
): DataColumn<PairSeries>[] {
  const kelvin = (value: number) => formatNumber(fromSi('temperature', value, units.temperature), 0);
  const unit = unitLabel('temperature', units.temperature);
  const extent = (row: PairSeries) => `${kelvin(row.temperatureMinimum)}–${kelvin(row.temperatureMaximum)}`;
  return [
    {
      id: 'weight',
      head: words.weight,
      name: words.weight,
      value: (row) => (row.carriesWeight ? words.in : words.out),
      cell: (row) => <Switch row={row} onToggle={() => toggle(row)} />,
    },
    {
      id: 'series',
      head: words.series,
      name: words.series,
      value: (row) => `${row.letter}, ${row.title}`,
      cell: (row) => (
        <>
          {row.letter}, <Link to={paths.series(row.id)}>{row.title}</Link>
          <chakra.span display={{ base: 'block', md: 'none' }} color="ink2" fontSize="13px" lineHeight="18px">
            {fill(words.summary, {
              method: row.method,
              points: row.points.length,
              temperatures: `${extent(row)} ${unit}`,
            })}
          </chakra.span>
        </>
      ),
    },
    { id: 'method', head: words.method, name: words.method, wideOnly: true, value: (row) => row.method },
    { id: 'n', head: <i>n</i>, name: 'n', numeric: true, wideOnly: true, value: (row) => row.points.length },
    {
      id: 'T',
      head: <i>T</i>,
      unit,
      name: `T / ${unit}`,
      numeric: true,
      wideOnly: true,
      value: (row) => row.temperatureMinimum,
      cell: extent,
    },
    {
      id: 'stated',
      head: <Typeset>{words.stated}</Typeset>,
      unit: '%',
      name: 'stated u / %',
      numeric: true,
      wideOnly: true,
      value: (row) => row.usualUncertainty,
      cell: (row) => (
        <span title={row.uncertaintyAssigned ? words.assigned : undefined}>
          {row.uncertaintyAssigned && <chakra.i color="ink3">{words.assigned} </chakra.i>}
          {percent(row.usualUncertainty, 1)}
        </span>
      ),
    },
    {
      id: 'offset',
      head: <Typeset>{words.offset}</Typeset>,
      unit: '%',
      name: 'offset / %',
      numeric: true,
      value: (row) => row.offset?.value ?? null,
      cell: (row) => row.offset && `${formatSigned(100 * row.offset.value, 1)} ± ${percent(row.offset.uncertainty, 1)}`,
    },
    {
      id: 'plot',
      head: <chakra.span whiteSpace="nowrap">{words.scale}</chakra.span>,
      name: 'u of the offset / %',
      wideOnly: true,
      sortable: false,
      value: (row) => row.offset?.uncertainty ?? null,
      cell: (row) =>
        row.offset && (
          <DotPlot
            value={row.offset.value}
            halfWidth={row.offset.uncertainty}
            band={tint ?? 0}
            from={-SCALE}
            to={SCALE}
            width={96}
            label={fill(words.offsetLabel, {
              offset: formatSigned(100 * row.offset.value, 1),
              u: percent(row.offset.uncertainty, 1),
            })}
          />
        ),
    },
  ];
}

function Switch({ row, onToggle }: { readonly row: PairSeries; readonly onToggle: () => void }) {
  const styles = useSlotRecipe({ recipe: ledgerRecipe })();
  const label = fill(row.carriesWeight ? words.switchIn : words.switchOut, { series: row.letter });
  return (
    <chakra.button
      type="button"
      css={styles.switch}
      aria-pressed={row.carriesWeight}
      aria-label={label}
      onClick={onToggle}
    >
      <SeriesKey index={row.mark} open={!row.carriesWeight} />
      {row.carriesWeight ? words.in : words.out}
    </chakra.button>
  );
}
