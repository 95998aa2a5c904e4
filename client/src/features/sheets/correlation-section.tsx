import { chakra } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { useSearchParams } from 'react-router-dom';
import { type SheetNumbersFragment, type SheetPageFragment } from '../../gql/graphql';
import { parseNumber } from '../../lib/parse-number';
import { toSi, type Quantity as QuantityKind } from '../../lib/units';
import { Equation } from '../../ui/numbers/equation';
import { Quantity } from '../../ui/numbers/quantity';
import { Runs } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Section } from '../../ui/page/section';
import { Evaluator } from './evaluator';
import { Paragraphs } from './paragraphs';
import { FollowBlock } from './follow-block';
import { DownloadsBlock, IdentityBlock, WorkBlock } from './sheet-margin';
import { sheetStrings } from '../../strings/sheets';

interface CorrelationSectionProps {
  readonly number: number;
  readonly title: string;
  readonly version: SheetPageFragment;
  readonly code: string;
  readonly pairId: string;
}

/** The equation, its parameters, and the evaluator. */
export function CorrelationSection({ number, title, version, code, pairId }: CorrelationSectionProps) {
  const { correlation, range, margin } = version.content;
  const start = useStart(correlation);
  return (
    <Section
      number={number}
      title={title}
      id="correlation"
      tight
      margin={
        <>
          <MarginBlock title={sheetStrings.margin.from}>
            <Paragraphs paragraphs={margin.fit} />
          </MarginBlock>
          <DownloadsBlock version={version} code={code} />
          <IdentityBlock version={version} />
          <WorkBlock version={version} code={code} pairId={pairId} />
          <FollowBlock sheetId={version.sheet.id} />
        </>
      }
    >
      <chakra.div
        display={{ base: 'block', md: 'flex' }}
        gap={{ md: '40px', lg: '72px' }}
        alignItems="center"
        paddingTop="10px"
        flexWrap="wrap"
      >
        <Equation pieces={correlation.equation} spoken={correlation.spoken} />
        <Parameters correlation={correlation} />
      </chakra.div>
      <Evaluator
        target={{ code, number: version.number }}
        range={range}
        start={start}
        predicts={version.fit.statistics.betweenSeriesDeviation != null}
      />
    </Section>
  );
}

/** The state in the address (`?T=320&P=90`, in K and kPa), else the reference state. */
function useStart(correlation: SheetNumbersFragment['correlation']) {
  const [search] = useSearchParams();
  const asked = (name: string) => parseNumber(search.get(name) ?? '');
  const reference = (symbol: string) => correlation.parameters.find((parameter) => parameter.symbol === symbol)?.value;
  const [temperature, pressure] = [asked('T'), asked('P')];
  return {
    temperature: temperature !== null && temperature > 0 ? temperature : (reference('T0') ?? 298.15),
    pressure: pressure !== null && pressure > 0 ? toSi('pressure', pressure, 'kPa') : (reference('P0') ?? 101_325),
  };
}

type Parameter = SheetNumbersFragment['correlation']['parameters'][number];

/** Aligned on “=”; fitted ones in weight 600. */
function Parameters({ correlation }: { readonly correlation: SheetNumbersFragment['correlation'] }) {
  return (
    <chakra.dl
      display="grid"
      gridTemplateColumns="auto auto 1fr"
      gap="2px 14px"
      marginTop={{ base: '18px', md: 0 }}
      fontSize="15px"
      lineHeight="26px"
      fontFeatureSettings='"tnum"'
    >
      {correlation.parameters.map((parameter) => (
        <Row
          key={parameter.symbol}
          label={<Runs runs={parameter.label} />}
          strong={parameter.standardUncertainty != null}
        >
          <ParameterValue parameter={parameter} />
        </Row>
      ))}
      {correlation.coefficients.map((coefficient, i) => (
        <Row key={i} label={<Runs runs={coefficient.label} />}>
          {coefficient.printed}
        </Row>
      ))}
    </chakra.dl>
  );
}

const KIND_OF_UNIT: Readonly<Record<string, QuantityKind>> = {
  K: 'temperature',
  Pa: 'pressure',
  'm2/s': 'diffusivity',
};

/** As the sheet prints it; what is a temperature, pressure or diffusivity in the reader's unit. */
function ParameterValue({ parameter }: { readonly parameter: Parameter }) {
  const kind = KIND_OF_UNIT[parameter.unit];
  const note = parameter.note ? `, ${parameter.note}` : '';
  if (kind === undefined) return <>{parameter.printed + note}</>;
  return (
    <>
      <Quantity kind={kind} value={parameter.value} uncertainty={parameter.standardUncertainty ?? null} />
      {note}
    </>
  );
}

const Row = ({
  label,
  strong = false,
  children,
}: {
  readonly label: ReactNode;
  readonly strong?: boolean;
  readonly children: ReactNode;
}) => (
  <>
    <chakra.dt textAlign="right">{label}</chakra.dt>
    <dd aria-hidden>=</dd>
    <chakra.dd fontWeight={strong ? 600 : 400}>{children}</chakra.dd>
  </>
);
