import { useQuery } from '@apollo/client/react';
import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { type Control } from 'react-hook-form';
import { BringInSeriesDocument } from '../../gql/graphql';
import { bringInStrings } from '../../strings/bring-in';
import { WordButton } from '../../ui/form/button';
import { Fields, NumberField, SelectField, TextField } from '../../ui/form/field';
import { Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Section } from '../../ui/page/section';
import { type ReadAnswer } from './answer';
import { type HeaderValues } from './draft';
import { type Header } from './header-schema';
import { SubstanceField } from './substance-field';

const pair = bringInStrings.pair;
const words = bringInStrings.header;
const origins = Object.entries(bringInStrings.origins).map(([value, label]) => ({ value, label }));

type HeaderControl = Control<HeaderValues, unknown, Header>;

interface PairSectionProps {
  readonly control: HeaderControl;
  readonly answer: ReadAnswer | null;
}

/** Which pair, by which method, read from what. */
export function PairSection({ control, answer }: PairSectionProps) {
  const usual = answer?.assignedUncertainty;
  return (
    <Section number={1} title={pair.title} id="pair" tight>
      <Fields columns={4}>
        <SubstanceField control={control} name="first" label={pair.first} />
        <SubstanceField control={control} name="second" label={pair.second} />
        <TextField control={control} name="method" label={pair.method} hint={pair.methodHint} />
        <SelectField control={control} name="dataOrigin" label={pair.readFrom} choices={origins} />
      </Fields>
      <chakra.p textStyle="caption" color="ink2" marginTop="10px">
        <Typeset>{pair.order}</Typeset>
        {usual !== undefined && (
          <>
            {' '}
            <Typeset values={{ percent: 100 * usual.relative, source: usual.source }}>{pair.usual}</Typeset>
          </>
        )}
      </chakra.p>
    </Section>
  );
}

interface HeaderSectionProps {
  readonly control: HeaderControl;
  readonly pairIds: readonly [string, string];
}

/** Title, source, apparatus, what is common to all points, and whose data it repeats. */
export function HeaderSection({ control, pairIds: [a, b] }: HeaderSectionProps) {
  const { data } = useQuery(BringInSeriesDocument, {
    variables: { a: { id: a }, b: { id: b } },
    skip: a === '' || b === '' || a === b,
  });
  const series = data?.pair?.series.edges.map(({ node }) => node).filter(({ status }) => status !== 'RETIRED') ?? [];
  const choices = [
    { value: '', label: words.noneKnown },
    ...series.map(({ id, title }) => ({ value: id, label: title })),
  ];
  return (
    <Section number={4} title={words.title} id="header" margin={<WhyTwo />}>
      <Fields columns={2}>
        <TextField control={control} name="title" label={words.name} />
        <TextField control={control} name="source" label={words.source} />
        <TextField control={control} name="apparatus" label={words.apparatus} />
        <SelectField
          control={control}
          name="sameDataAsId"
          label={words.sameData}
          choices={choices}
          hint={words.sameNote}
        />
        <NumberField
          control={control}
          name="commonPercent"
          label={<Typeset>{words.common}</Typeset>}
          unit="%"
          width="180px"
        />
      </Fields>
      <chakra.p textStyle="caption" color="ink2" marginTop="10px">
        {words.note}
      </chakra.p>
    </Section>
  );
}

function WhyTwo() {
  const [shown, setShown] = useState(false);
  return (
    <MarginBlock>
      <p>
        <WordButton aria-expanded={shown} onClick={() => setShown(!shown)}>
          {words.why}
        </WordButton>
      </p>
      {shown && <p>{words.whyWords}</p>}
    </MarginBlock>
  );
}
