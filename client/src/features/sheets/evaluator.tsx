import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useState, type ReactNode } from 'react';
import { errorMessage } from '../../lib/apollo';
import { useEdition } from '../../lib/edition';
import { fill } from '../../lib/fill';
import { formatNumber, formatShort, placesFor, withUnit } from '../../lib/format-quantity';
import {
  differenceFromSi,
  diffusivityUnits,
  fromSi,
  pressureUnits,
  readerUnits,
  temperatureUnits,
  unitLabel,
  useReaderUnits,
} from '../../lib/units';
import { sheetStrings } from '../../strings/sheets';
import { Banner } from '../../ui/feedback/banner';
import { Failed } from '../../ui/feedback/states';
import { RangeMark, WarnMark } from '../../ui/marks/marks';
import { TemperatureRule } from '../../ui/marks/temperature-rule';
import { Concise, Unit } from '../../ui/numbers/num';
import { rangeText } from '../../ui/numbers/quantity';
import { evaluatorRecipe } from '../../ui/recipes/content.recipe';
import { SentenceField, SentenceUnit } from '../../ui/form/sentence-field';
import { entryOf, inUnit, typedEntry, type Entry } from './evaluator-entry';
import { type Evaluated, type EvaluationTarget, useEvaluation } from './use-evaluation';

const words = sheetStrings.evaluator;

export interface EvaluatorRange {
  readonly temperatureMinimum: number;
  readonly temperatureMaximum: number;
  readonly pressureMinimum: number;
  readonly pressureMaximum: number;
}

interface EvaluatorProps {
  readonly target: EvaluationTarget;
  /** K and Pa */
  readonly range: EvaluatorRange;
  /** K and Pa: where it starts. */
  readonly start: { readonly temperature: number; readonly pressure: number };
  /** A between-series deviation is known, so that the interval for one new laboratory is too. */
  readonly predicts: boolean;
}

/** D at the reader's T and P: a sentence with fields in it, answered by the service, with u, U, k and the range beside it. */
export function Evaluator({ target, range, start, predicts }: EvaluatorProps) {
  const styles = useSlotRecipe({ recipe: evaluatorRecipe })();
  const units = useReaderUnits();
  const edition = useEdition();
  const [typedTemperature, setTemperature] = useState<Entry<'temperature'>>(() =>
    entryOf('temperature', start.temperature, units.temperature),
  );
  const [typedPressure, setPressure] = useState<Entry<'pressure'>>(() =>
    entryOf('pressure', start.pressure, units.pressure),
  );
  const temperature = inUnit('temperature', typedTemperature, units.temperature);
  const pressure = inUnit('pressure', typedPressure, units.pressure);
  const mean = useEvaluation(target, temperature.si, pressure.si, 'MEAN');
  const newSeries = useEvaluation(target, temperature.si, pressure.si, 'NEW_SERIES', !predicts);
  const problem = temperature.si === null ? words.badTemperature : pressure.si === null ? words.badPressure : null;
  const rangeWords = {
    temperature: rangeText('temperature', range.temperatureMinimum, range.temperatureMaximum, units.temperature),
    pressure: rangeText('pressure', range.pressureMinimum, range.pressureMaximum, units.pressure),
  };

  return (
    <>
      <chakra.form css={styles.root} aria-label={words.label} onSubmit={(event) => event.preventDefault()}>
        <chakra.div css={styles.line}>
          <span>{words.at}</span>
          <chakra.span css={styles.pair}>
            <i>T</i>
            {' = '}
            <SentenceField
              label={words.temperature}
              value={temperature.text}
              invalid={temperature.si === null}
              onChange={(text) => setTemperature(typedEntry('temperature', text, units.temperature))}
              unit={<UnitOf quantity="temperature" table={temperatureUnits} />}
            />
          </chakra.span>
          <span>{words.and}</span>
          <chakra.span css={styles.pair}>
            <i>P</i>
            {' = '}
            <SentenceField
              label={words.pressure}
              value={pressure.text}
              invalid={pressure.si === null}
              onChange={(text) => setPressure(typedEntry('pressure', text, units.pressure))}
              unit={<UnitOf quantity="pressure" table={pressureUnits} />}
            />
          </chakra.span>
          <chakra.span css={styles.pair}>
            <i>D</i>
            {' = '}
            <chakra.output css={styles.answer} aria-live="polite" aria-busy={mean.busy}>
              <Answer value={mean.value} />
            </chakra.output>{' '}
            <DiffusivityUnit />
          </chakra.span>
        </chakra.div>
        <chakra.div css={styles.sub}>
          {problem === null ? (
            <Beside
              value={mean.value}
              newSeries={newSeries.value}
              range={`${rangeWords.temperature}, ${rangeWords.pressure}`}
            />
          ) : (
            <Problem>{problem}</Problem>
          )}
        </chakra.div>
        <TemperatureRule
          low={range.temperatureMinimum}
          high={range.temperatureMaximum}
          at={temperature.si}
          onChange={(kelvin) => setTemperature(entryOf('temperature', Math.max(1, kelvin), units.temperature))}
          edition={edition}
          format={(kelvin) =>
            withUnit(
              formatShort(fromSi('temperature', kelvin, units.temperature), 5),
              unitLabel('temperature', units.temperature),
            )
          }
          label={words.rule}
        />
      </chakra.form>
      {mean.error !== undefined && <Failed what={words.failed} why={errorMessage(mean.error)} />}
      {problem === null && mean.value?.outside && (
        <Banner
          tone="warning"
          live
          mark={
            <>
              <RangeMark within={false} />
              <b>{sheetStrings.banner.outside}</b>
            </>
          }
        >
          {fill(sheetStrings.banner.outsideWords, rangeWords)}
        </Banner>
      )}
    </>
  );
}

function Answer({ value }: { readonly value: Evaluated | null }) {
  const { diffusivity: unit } = useReaderUnits();
  if (value === null) return <>–</>;
  return (
    <Concise
      value={fromSi('diffusivity', value.diffusivity, unit)}
      uncertainty={differenceFromSi('diffusivity', value.standardUncertainty, unit)}
    />
  );
}

/** The second line: range mark with both ranges, u, U and k, and the interval for one new laboratory. */
function Beside({
  value,
  newSeries,
  range,
}: {
  readonly value: Evaluated | null;
  readonly newSeries: Evaluated | null;
  readonly range: string;
}) {
  if (value === null) return null;
  return (
    <>
      <span>
        <RangeMark within={!value.outside} />
        {value.outside ? <chakra.span color="warn">{words.out}</chakra.span> : <b>{words.within}</b>}, {range}
      </span>
      <span>
        <i>u</i>
        {' = '}
        <Uncertainty value={value.standardUncertainty} />
      </span>
      <span>
        <i>U</i>
        {' = '}
        <Uncertainty value={value.expandedUncertainty} />, <i>k</i>
        {` = ${formatNumber(value.coverageFactor, 2)}`}
      </span>
      {newSeries !== null && (
        <span>
          {fill(words.newLaboratory, { value: '' })}
          <Uncertainty value={newSeries.expandedUncertainty} />
        </span>
      )}
    </>
  );
}

/** An uncertainty alone, to two significant digits, with its unit. */
function Uncertainty({ value }: { readonly value: number }) {
  const { diffusivity: unit } = useReaderUnits();
  const shown = differenceFromSi('diffusivity', value, unit);
  const power = shown !== 0 && Math.abs(shown) < 1e-5 ? Math.floor(Math.log10(Math.abs(shown))) : 0;
  const mantissa = shown / 10 ** power;
  return (
    <>
      {formatNumber(mantissa, placesFor(mantissa))}
      {power !== 0 && (
        <>
          {' × 10'}
          <sup>{String(power).replace('-', '−')}</sup>
        </>
      )}
      {'\u00a0'}
      <Unit>{unitLabel('diffusivity', unit)}</Unit>
    </>
  );
}

const Problem = ({ children }: { readonly children: ReactNode }) => (
  <chakra.span color="warn" role="alert">
    <WarnMark />
    {children}
  </chakra.span>
);

function UnitOf({
  quantity,
  table,
}: {
  readonly quantity: 'temperature' | 'pressure';
  readonly table: Readonly<Record<string, { readonly label: string }>>;
}) {
  const units = useReaderUnits();
  return (
    <SentenceUnit
      label={words.unitOf[quantity]}
      value={units[quantity]}
      table={table}
      onChange={(unit) => readerUnits.set({ ...units, [quantity]: unit })}
    />
  );
}

function DiffusivityUnit() {
  const units = useReaderUnits();
  return (
    <SentenceUnit
      framed
      label={words.unitOf.diffusivity}
      value={units.diffusivity}
      table={diffusivityUnits}
      onChange={(unit) => readerUnits.set({ ...units, diffusivity: unit as typeof units.diffusivity })}
    />
  );
}
