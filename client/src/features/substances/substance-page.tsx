import { useQuery } from '@apollo/client/react';
import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { Fragment } from 'react';
import { Link } from 'react-router-dom';
import { SheetsOfSubstanceDocument, SubstanceDetailDocument, type SubstanceFieldsFragment } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { formatNumber, formatShort, withUnit } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { hasRole, usePerson } from '../../lib/session';
import { substanceStrings } from '../../strings/substances';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { Formula } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening, Section } from '../../ui/page/section';
import { statementsRecipe } from '../../ui/recipes/content.recipe';
import { ConstantsTable, EquationsTable } from './constants-tables';

const words = substanceStrings.detail;

/** One substance: what it is, its constants with range and source, its cautions. */
export function SubstancePage({ id }: { readonly id: string }) {
  const { data, error, refetch } = useQuery(SubstanceDetailDocument, { variables: { id } });
  const path = [{ name: substanceStrings.title, to: paths.substances() }];
  if (data?.substance) return <Substance substance={data.substance} />;
  return (
    <Page title={substanceStrings.title} path={[...path, { name: '…' }]}>
      <Opening small title={substanceStrings.title}>
        {error ? (
          <Failed what={substanceStrings.failed} why={errorMessage(error)} onRetry={() => void refetch()} />
        ) : data ? (
          <Empty sentence={substanceStrings.missing} />
        ) : (
          <Loading what={substanceStrings.what} />
        )}
      </Opening>
    </Page>
  );
}

function Substance({ substance }: { readonly substance: SubstanceFieldsFragment }) {
  const title = substance.name.charAt(0).toUpperCase() + substance.name.slice(1);
  const values = substance.constants.filter((constant) => constant.value != null);
  const equations = substance.constants.filter((constant) => constant.value == null);
  const next = equations.length > 0 ? 3 : 2;
  return (
    <Page
      title={title}
      path={[{ name: substanceStrings.title, to: paths.substances() }, { name: title }]}
      folio={<span>{words.real}</span>}
    >
      <Opening
        title={title}
        lead={<Formula>{substance.formula}</Formula>}
        margin={<SubstanceFacts substance={substance} />}
      >
        <Identifiers substance={substance} />
      </Opening>
      <Section number={1} title={words.constants} id="constants" tight margin={<ConstantsMargin id={substance.id} />}>
        {values.length === 0 ? (
          <Empty sentence={words.none} />
        ) : (
          <ConstantsTable constants={values} file={`${substance.name}-constants`} />
        )}
      </Section>
      {equations.length > 0 && (
        <Section number={2} title={words.equationsTitle} id="equations">
          <EquationsTable equations={equations} file={`${substance.name}-equations`} />
        </Section>
      )}
      {substance.composition && (
        <Section number={next} title={words.composition} id="composition">
          <ul style={{ listStyle: 'none' }}>
            {substance.composition.map((component) => (
              <li
                key={component.casNumber}
              >{`${component.casNumber}: ${words.fraction} ${formatShort(component.moleFraction)}`}</li>
            ))}
          </ul>
        </Section>
      )}
      {substance.cautions.length > 0 && (
        <Safety substance={substance} number={substance.composition ? next + 1 : next} />
      )}
    </Page>
  );
}

function SubstanceFacts({ substance }: { readonly substance: SubstanceFieldsFragment }) {
  const { data } = useQuery(SheetsOfSubstanceDocument, { variables: { name: substance.name } });
  const sheets = (data?.dataSheets.edges ?? []).filter(
    ({ node }) => node.current && node.pair.substances.some(({ id }) => id === substance.id),
  );
  return (
    <MarginBlock
      entries={[
        [words.molarMass, withUnit(formatNumber(1000 * substance.molarMass, 3), 'g/mol')],
        [
          words.sheets,
          sheets.length > 0 &&
            sheets.map(({ node }, i) => (
              <Fragment key={node.id}>
                {i > 0 && ', '}
                <Link
                  to={paths.sheet(node.code)}
                >{`+ ${node.pair.substances.find(({ id }) => id !== substance.id)?.name ?? ''}`}</Link>
              </Fragment>
            )),
        ],
      ]}
    />
  );
}

const Identifiers = ({ substance }: { readonly substance: SubstanceFieldsFragment }) => {
  const entries = [
    [words.cas, substance.casNumber],
    [words.inchi, substance.inchi?.replace(/^InChI=/, '')],
    [words.also, substance.synonyms.join(', ')],
  ] as const;
  return (
    <chakra.div display="flex" flexWrap="wrap" gap="2px 36px" textStyle="small" color="ink2" marginTop="16px">
      {entries.map(
        ([label, value]) =>
          value && (
            <chakra.p key={label} overflowWrap="anywhere">
              <chakra.b fontWeight={600} color="ink">
                {label}
              </chakra.b>{' '}
              {value}
            </chakra.p>
          ),
      )}
    </chakra.div>
  );
};

function ConstantsMargin({ id }: { readonly id: string }) {
  const mayEdit = hasRole(usePerson(), 'RESEARCHER', 'EDITOR');
  return (
    <>
      <MarginBlock title={words.change}>
        <p>{words.changeWords}</p>
      </MarginBlock>
      {mayEdit && (
        <MarginBlock>
          <p>
            <Link to={paths.editSubstance(id)}>{words.edit}</Link>
          </p>
        </MarginBlock>
      )}
    </>
  );
}

function Safety({ substance, number }: { readonly substance: SubstanceFieldsFragment; readonly number: number }) {
  const styles = useSlotRecipe({ recipe: statementsRecipe })({ kind: 'cautions' });
  const sources = [...new Set(substance.cautions.map((caution) => caution.source))];
  return (
    <Section
      number={number}
      title={words.safety}
      id="safety"
      margin={
        <MarginBlock>
          {sources.map((source) => (
            <p key={source}>{source}</p>
          ))}
        </MarginBlock>
      }
    >
      <chakra.ul css={styles.root}>
        {substance.cautions.map((caution) => (
          <chakra.li key={caution.text} css={styles.item}>
            {caution.text}
          </chakra.li>
        ))}
        <chakra.li css={styles.item}>{words.local}</chakra.li>
      </chakra.ul>
    </Section>
  );
}
