import { chakra } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { counted } from '../../lib/counted';
import { fill } from '../../lib/fill';
import { formatShort } from '../../lib/format-quantity';
import { bringInStrings } from '../../strings/bring-in';
import { Progress } from '../../ui/feedback/states';
import { Button, WordButton } from '../../ui/form/button';
import { FormError } from '../../ui/form/field';
import { WarnMark } from '../../ui/marks/marks';
import { StateMark } from '../../ui/marks/state-mark';
import { QuantityRange } from '../../ui/numbers/quantity';
import { Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Section } from '../../ui/page/section';
import { type ReadAnswer } from './answer';
import { type Draft } from './draft';
import { type Keeping } from './use-keeping';

const words = bringInStrings.keep;

/** What stands in the way, and how to get there. */
export interface Missing {
  readonly words: string;
  readonly go: () => void;
}

interface KeepSectionProps {
  readonly draft: Draft;
  readonly answer: ReadAnswer | null;
  readonly missing: readonly Missing[];
  readonly keeping: Keeping;
  readonly refusal: string | undefined;
}

/** What will be kept, in words and figures, and the one button that does it. */
export function KeepSection({ draft, answer, missing, keeping, refusal }: KeepSectionProps) {
  return (
    <Section
      number={5}
      title={words.title}
      id="keep"
      margin={
        <MarginBlock title={words.whole}>
          <p>{words.wholeWords}</p>
        </MarginBlock>
      }
    >
      <chakra.dl css={SUMMARY}>
        {entriesOf(draft, answer).map(([label, value]) => [
          <dt key={`${label} label`}>{label}</dt>,
          <dd key={label}>{value}</dd>,
        ])}
      </chakra.dl>
      <chakra.div marginTop="22px">
        {keeping.isRunning ? (
          <Running keeping={keeping} />
        ) : (
          <Button type="submit" kind="primary" waitingFor={missing.length > 0 && <MissingWords missing={missing} />}>
            {words.action}
          </Button>
        )}
      </chakra.div>
      <chakra.div marginTop="10px">
        <FormError message={refusal === undefined ? undefined : `${words.refused} ${refusal}`} />
      </chakra.div>
    </Section>
  );
}

function MissingWords({ missing }: { readonly missing: readonly Missing[] }) {
  return (
    <>
      <chakra.span color="warn">
        <WarnMark />
        {bringInStrings.missing.lead}
      </chakra.span>{' '}
      {missing.map(({ words: what, go }, i) => (
        <span key={what}>
          {i > 0 && ', '}
          <WordButton onClick={go}>{what}</WordButton>
        </span>
      ))}
    </>
  );
}

function Running({ keeping: { progress, cancel } }: { readonly keeping: Keeping }) {
  return (
    <chakra.div maxWidth="420px" textStyle="small" role="status">
      <p>{words.running}</p>
      <Progress label={words.running} share={null}>
        <chakra.span color="ink2">{progress && fill(words.phase[progress.phase], { n: progress.rows })}</chakra.span>{' '}
        <WordButton onClick={cancel}>{words.cancel}</WordButton>
      </Progress>
    </chakra.div>
  );
}

type Entry = readonly [label: string, value: ReactNode];

function entriesOf(draft: Draft, answer: ReadAnswer | null): Entry[] {
  const { header } = draft;
  const pair = [header.first, header.second].map(({ id, name }) => (id === '' ? '…' : name)).join(' + ');
  const series: Entry = [
    words.series,
    <>
      {fill(words.seriesWords, { pair, method: header.method.trim() || '…' })}{' '}
      <StateMark state="draft">{words.draft}</StateMark>, {words.yours}
    </>,
  ];
  if (answer === null) return [series];
  const { temperature, pressure, pointCount, source } = answer;
  return [
    series,
    [words.points, fill(words.pointsOf, { points: pointCount, rows: source.rowCount })],
    ...(temperature === null
      ? []
      : [
          [
            words.temperature,
            <QuantityRange key="T" kind="temperature" low={temperature.minimum} high={temperature.maximum} />,
          ] as const,
        ]),
    ...(pressure === null
      ? []
      : [
          [
            words.pressure,
            <QuantityRange key="P" kind="pressure" low={pressure.minimum} high={pressure.maximum} />,
          ] as const,
        ]),
    ...(pointCount === 0 ? [] : [[words.uncertainty, <UncertaintyWords key="u" answer={answer} />] as const]),
    [words.beside, besideWords(draft)],
  ];
}

function UncertaintyWords({
  answer: { assignedUncertainty, pointCount, commonRelativeUncertainty: common },
}: {
  readonly answer: ReadAnswer;
}) {
  const { relative, source, pointCount: assigned } = assignedUncertainty;
  const parts = [
    ...(assigned < pointCount ? [words.stated] : []),
    ...(assigned > 0
      ? [
          fill(words.assigned, {
            percent: formatShort(100 * relative, 3),
            points: counted(words.assignedTo, assigned),
            source,
          }),
        ]
      : []),
    ...(common === null ? [] : [fill(words.common, { percent: formatShort(100 * common, 3) })]),
  ];
  return <Typeset>{parts.join('; ')}</Typeset>;
}

const besideWords = ({ way, file }: Draft): string =>
  way === 'UPLOAD' && file !== null
    ? fill(words.besideFile, { name: file.name, hash: file.sha256.slice(0, 8) })
    : words.besideText;

const SUMMARY = {
  display: 'grid',
  gridTemplateColumns: { base: '1fr', md: '150px minmax(0, 1fr)' },
  gap: { base: '0 16px', md: '4px 16px' },
  fontSize: '15px',
  lineHeight: '25px',
  marginTop: '14px',
  maxWidth: '760px',
  '& dt': { color: 'ink2' },
  '& dd': { fontFeatureSettings: '"tnum"', marginBottom: { base: '8px', md: 0 } },
} as const;
