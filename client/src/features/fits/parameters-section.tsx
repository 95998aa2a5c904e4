import { chakra } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { fill } from '../../lib/fill';
import { formatNumber, formatShort, roundTogether, withUnit } from '../../lib/format-quantity';
import { differenceFromSi, fromSi, type ReaderUnits, unitLabel, useReaderUnits } from '../../lib/units';
import { fitStrings } from '../../strings/fits';
import { Num, Unit } from '../../ui/numbers/num';
import { QuantityRange } from '../../ui/numbers/quantity';
import { Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Section } from '../../ui/page/section';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { type DetailedFit } from './detailed-fit';
import { ParameterSymbol, quantityOf } from './parameter';
import { TauSlope } from './result-block';
import { deviationText } from './small-number';
import { probability } from './statements';

const words = fitStrings.fitPage;
type Parameter = DetailedFit['correlation']['parameters'][number];

/** The parameters with their intervals, how they hang together, and how well the points are met. */
export function ParametersSection({ fit }: { readonly fit: DetailedFit }) {
  const units = useReaderUnits();
  const k = fit.analysis.correlation.coverage.coverageFactor;
  const { statistics, betweenSeriesSlopeDeviation: slope } = fit.analysis;
  return (
    <Section number={1} title={words.parameters} id="parameters" tight margin={<RecipeBlock fit={fit} />}>
      <DataTable
        label={words.parameters}
        columns={parameterColumns(units, k)}
        rows={fit.correlation.parameters}
        rowId={({ symbol }) => symbol}
        file={`fit-${fit.number}-parameters`}
        filterable={false}
      />
      <chakra.div
        display="grid"
        gridTemplateColumns={{ base: '1fr', md: 'repeat(3, minmax(0, 1fr))' }}
        gap="20px 40px"
        marginTop="22px"
      >
        <Matrix fit={fit} />
        <Figures
          title={words.between}
          rows={[
            [
              <Typeset key="t">{words.intercept}</Typeset>,
              statistics.betweenSeriesDeviation == null
                ? null
                : withUnit(deviationText(100 * statistics.betweenSeriesDeviation), '%'),
            ],
            [<Slope key="s" />, slope == null ? null : deviationText(slope)],
            [
              <Typeset key="i">{words.iSquared}</Typeset>,
              statistics.iSquared == null ? null : withUnit(formatNumber(100 * statistics.iSquared, 0), '%'),
            ],
            [
              <Typeset key="q">{fill(words.cochran, { nu: statistics.seriesCount - 1 })}</Typeset>,
              statistics.cochranQ == null ? null : formatNumber(statistics.cochranQ, 1),
            ],
          ]}
        />
        <Figures
          title={words.goodness}
          rows={[
            [
              <Typeset key="c">{fill(words.chiSquare, { nu: statistics.residualDegreesOfFreedom })}</Typeset>,
              statistics.chiSquare == null
                ? null
                : formatNumber(statistics.chiSquare, 1) +
                  (statistics.chiSquareProbability == null
                    ? ''
                    : `, p ${probability(statistics.chiSquareProbability)}`),
            ],
            [
              <Typeset key="r">{words.reduced}</Typeset>,
              statistics.reducedChiSquare == null ? null : formatNumber(statistics.reducedChiSquare, 2),
            ],
            ['AICc', statistics.aicc == null ? null : formatNumber(statistics.aicc, 1)],
            [
              words.standardError,
              statistics.residualStandardError == null || fit.objective !== 'LN_DIFFUSIVITY'
                ? null
                : withUnit(formatShort(100 * statistics.residualStandardError, 2), '%'),
            ],
          ]}
        />
      </chakra.div>
    </Section>
  );
}

function parameterColumns(units: ReaderUnits, k: number): DataColumn<Parameter>[] {
  const inUnit = (parameter: Parameter, value: number, convert: typeof fromSi | typeof differenceFromSi) => {
    const quantity = quantityOf(parameter);
    return quantity === null ? value : convert(quantity, value, units[quantity]);
  };
  const rounded = (parameter: Parameter) => {
    const { value, standardUncertainty: u } = parameter;
    return u == null ? null : roundTogether(inUnit(parameter, value, fromSi), inUnit(parameter, u, differenceFromSi));
  };
  const end = (parameter: Parameter, sign: 1 | -1): string => {
    const { value, standardUncertainty: u } = parameter;
    return formatNumber(inUnit(parameter, value + sign * k * (u ?? 0), fromSi), rounded(parameter)?.places ?? 0);
  };
  const unitOf = (parameter: Parameter): string => {
    const quantity = quantityOf(parameter);
    return quantity === null ? parameter.unit : unitLabel(quantity, units[quantity]);
  };
  return [
    {
      id: 'symbol',
      head: words.parameter,
      name: words.parameter,
      value: ({ symbol }) => symbol,
      cell: ({ symbol }) => <ParameterSymbol symbol={symbol} />,
    },
    {
      id: 'value',
      head: words.value,
      name: words.value,
      numeric: true,
      value: ({ value }) => value,
      cell: (row) => rounded(row)?.value ?? `${formatShort(inUnit(row, row.value, fromSi))}, held`,
    },
    {
      id: 'u',
      head: <Typeset>{words.uncertainty}</Typeset>,
      name: 'u',
      numeric: true,
      value: ({ standardUncertainty }) => standardUncertainty ?? null,
      cell: (row) => rounded(row)?.uncertainty ?? '',
    },
    {
      id: 'interval',
      head: words.interval,
      unit: <Typeset values={{ k: formatNumber(k, 2) }}>{words.coverage}</Typeset>,
      name: words.interval,
      numeric: true,
      sortable: false,
      value: (row) => (row.standardUncertainty == null ? null : `${end(row, -1)} to ${end(row, 1)}`),
    },
    {
      id: 'unit',
      head: words.unit,
      name: words.unit,
      sortable: false,
      value: unitOf,
      cell: (row) => <Unit>{unitOf(row)}</Unit>,
    },
  ];
}

const Slope = () => (
  <>
    <TauSlope />, {words.slope}
  </>
);

function Matrix({ fit }: { readonly fit: DetailedFit }) {
  const free = fit.correlation.parameters.filter(({ standardUncertainty }) => standardUncertainty != null);
  const matrix = fit.analysis.correlationMatrix;
  const rows = free.map(({ symbol }, i) => ({ symbol, values: matrix[i] ?? [] }));
  type Row = (typeof rows)[number];
  const columns: DataColumn<Row>[] = [
    {
      id: 'symbol',
      head: '',
      name: words.parameter,
      sortable: false,
      value: ({ symbol }) => symbol,
      cell: ({ symbol }) => <ParameterSymbol symbol={symbol} />,
    },
    ...free.map(({ symbol }, j): DataColumn<Row> => ({
      id: symbol,
      head: <ParameterSymbol symbol={symbol} />,
      name: symbol,
      numeric: true,
      sortable: false,
      value: ({ values }) => values[j] ?? null,
      cell: ({ values }) => (values[j] === undefined ? '' : values[j] === 1 ? '1' : formatNumber(values[j], 3)),
    })),
  ];
  return (
    <Titled title={words.matrix}>
      <DataTable
        label={words.matrix}
        columns={columns}
        rows={rows}
        rowId={({ symbol }) => symbol}
        file={`fit-${fit.number}-correlation`}
        filterable={false}
      />
    </Titled>
  );
}

const Titled = ({ title, children }: { readonly title: string; readonly children: ReactNode }) => (
  <div>
    <chakra.h3 textStyle="subsection" marginBottom="6px">
      {title}
    </chakra.h3>
    {children}
  </div>
);

/** Names at the left, figures at the right; what is not there is left away. */
const Figures = ({
  title,
  rows,
}: {
  readonly title: string;
  readonly rows: readonly (readonly [ReactNode, string | null])[];
}) => (
  <Titled title={title}>
    <chakra.dl
      borderTop="1.5px solid"
      borderColor="ink"
      paddingTop="6px"
      textStyle="small"
      display="grid"
      gridTemplateColumns="1fr auto"
      gap="0 12px"
    >
      {rows.map(
        ([name, value], i) =>
          value !== null && (
            <chakra.div key={i} display="contents">
              <chakra.dt color="ink2">{name}</chakra.dt>
              <chakra.dd textAlign="right">
                <Num>{value}</Num>
              </chakra.dd>
            </chakra.div>
          ),
      )}
    </chakra.dl>
  </Titled>
);

function RecipeBlock({ fit }: { readonly fit: DetailedFit }) {
  const { recipe } = fitStrings;
  const { validity, referencePressure, referenceTemperature, form } = fit.correlation;
  return (
    <MarginBlock
      title={words.recipe}
      entries={[
        [recipe.form, recipe.allForms[form]],
        [recipe.objective, <Typeset key="o">{recipe.setObjectives[fit.objective]}</Typeset>],
        [recipe.weighting, <Typeset key="w">{recipe.setWeightings[fit.weighting]}</Typeset>],
        [recipe.loss, recipe.losses[fit.loss]],
        [recipe.seriesEffect, recipe.seriesEffects[fit.seriesEffect]],
        [
          words.reference,
          <Reference key="reference" temperature={referenceTemperature} pressure={referencePressure} />,
        ],
        [
          <Typeset key="T">{words.rangeT}</Typeset>,
          <QuantityRange
            key="T"
            kind="temperature"
            low={validity.temperatureMinimum}
            high={validity.temperatureMaximum}
          />,
        ],
        [
          <Typeset key="P">{words.rangeP}</Typeset>,
          <span key="P">
            <QuantityRange kind="pressure" low={validity.pressureMinimum} high={validity.pressureMaximum} />,{' '}
            {validity.pressureBasis === 'MEASURED' ? words.measured : words.stated}
          </span>,
        ],
      ]}
    />
  );
}

function Reference({ temperature, pressure }: { readonly temperature: number; readonly pressure: number }) {
  const units = useReaderUnits();
  const T = withUnit(
    formatShort(fromSi('temperature', temperature, units.temperature)),
    unitLabel('temperature', units.temperature),
  );
  const P = withUnit(formatShort(fromSi('pressure', pressure, units.pressure)), unitLabel('pressure', units.pressure));
  return (
    <>
      {T}, {P}
    </>
  );
}
