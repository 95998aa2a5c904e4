import { useQuery } from '@apollo/client/react';
import { chakra } from '@chakra-ui/react';
import { Navigate, Link } from 'react-router-dom';
import { CurrentSheetDocument, type SheetPageFragment, SheetVersionDocument } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { formatDate, formatNumber, withUnit } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { sheetStrings } from '../../strings/sheets';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { Runs } from '../../ui/numbers/typeset';
import { Page } from '../../ui/page/page';
import { Opening } from '../../ui/page/section';
import { CautionsSection, CitationSection, UncertaintySection, VersionsSection } from './closing-sections';
import { CorrelationSection } from './correlation-section';
import { EstimatesSection } from './estimates-section';
import { FiguresSection } from './figures-section';
import { RecommendedSection } from './recommended-section';
import { SeriesSection } from './series-section';
import { StandingBlock } from './sheet-margin';
import { StandingBanner } from './standing-banner';

const sheets = { name: sheetStrings.path.sheets, to: paths.catalogue() };

/** One version of a sheet. */
export function SheetVersionPage({ code, number }: { readonly code: string; readonly number: string }) {
  const { data, error, refetch } = useQuery(SheetVersionDocument, { variables: { code, number } });
  const version = data?.dataSheet?.version;
  if (version)
    return (
      <SheetLeaf
        version={version}
        code={code}
        pairId={data.dataSheet?.pair.id ?? ''}
        current={data.dataSheet?.current?.number ?? null}
      />
    );
  return (
    <Page title={`${code} ${number}`} path={[sheets, { name: code }]}>
      <Opening small title={`${code}, ${fill(sheetStrings.path.version, { number })}`}>
        {error ? (
          <Failed what={sheetStrings.failed} why={errorMessage(error)} onRetry={() => void refetch()} />
        ) : data ? (
          <Empty sentence={sheetStrings.missing} />
        ) : (
          <Loading what={sheetStrings.what} />
        )}
      </Opening>
    </Page>
  );
}

/** The address without a number leads to the version in force. */
export function CurrentSheetPage({ code }: { readonly code: string }) {
  const { data, error, refetch } = useQuery(CurrentSheetDocument, { variables: { code } });
  const current = data?.dataSheet?.current;
  if (current) return <Navigate replace to={paths.version(code, current.number)} />;
  return (
    <Page title={code} path={[sheets, { name: code }]}>
      <Opening small title={code}>
        {error && <Failed what={sheetStrings.failed} why={errorMessage(error)} onRetry={() => void refetch()} />}
        {!error && !data && <Loading what={sheetStrings.what} />}
        {data && <Empty sentence={data.dataSheet?.versions.length ? sheetStrings.noCurrent : sheetStrings.missing} />}
        <chakra.ul listStyle="none" marginTop="8px">
          {data?.dataSheet?.versions.map((version) => (
            <li key={version.id}>
              <Link to={paths.version(code, version.number)}>{version.number}</Link>{' '}
              <StateMark state={stateOf(version.status)} />
            </li>
          ))}
        </chakra.ul>
      </Opening>
    </Page>
  );
}

interface SheetLeafProps {
  readonly version: SheetPageFragment;
  readonly code: string;
  readonly pairId: string;
  readonly current: string | null;
}

/** The sheet, from its one description. */
function SheetLeaf({ version, code, pairId, current }: SheetLeafProps) {
  const { content, number } = version;
  const file = `${code}-${number}`;
  const named = fill(sheetStrings.path.version, { number });
  return (
    <Page
      title={`${content.title}, ${code} ${number}`}
      path={[sheets, { name: content.title, to: paths.sheet(code) }, { name: named }]}
      folio={
        <>
          <StateMark state={stateOf(version.status)}>{`${named}, ${stateOf(version.status)}`}</StateMark>
          {version.releasedAt && <span>{formatDate(version.releasedAt)}</span>}
        </>
      }
    >
      <StandingBanner version={version} code={code} current={current} />
      <Opening
        title={content.title}
        lead={<Runs runs={content.lead} />}
        margin={<StandingBlock version={version} code={code} />}
      >
        <Substances content={content} />
      </Opening>
      {content.sections.map((section) => (
        <SheetSection key={section.id} section={section} version={version} code={code} pairId={pairId} file={file} />
      ))}
    </Page>
  );
}

const Substances = ({ content }: { readonly content: SheetPageFragment['content'] }) => (
  <chakra.div display="flex" flexWrap="wrap" gap="2px 36px" textStyle="small" color="ink2" marginTop="16px">
    {content.substances.map((substance) => (
      <p key={substance.name}>
        <chakra.b fontWeight={600} color="ink">
          {substance.name}
        </chakra.b>{' '}
        <Runs runs={substance.formula} />
        {substance.casNumber && `, ${substance.casNumber}`}
        {`, ${withUnit(formatNumber(1000 * substance.molarMass, 3), 'g/mol')}`}
      </p>
    ))}
    {content.summary !== '' && (
      <chakra.p css={{ flexBasis: '100%' }} maxWidth="640px">
        {content.summary}
      </chakra.p>
    )}
  </chakra.div>
);

interface SheetSectionProps extends Omit<SheetLeafProps, 'current'> {
  readonly section: SheetPageFragment['content']['sections'][number];
  readonly file: string;
}

/** One section of a sheet, by its id; pages that edit and review a version show them, too. */
export function SheetSection({ section: { id, number, title }, version, code, pairId, file }: SheetSectionProps) {
  const { content } = version;
  const shared = { number, title, content, file };
  switch (id) {
    case 'correlation':
      return <CorrelationSection number={number} title={title} version={version} code={code} pairId={pairId} />;
    case 'figures':
      return <FiguresSection {...shared} />;
    case 'recommended':
      return <RecommendedSection {...shared} />;
    case 'series':
      return <SeriesSection {...shared} />;
    case 'estimates':
      return <EstimatesSection number={number} title={title} estimates={content.estimates} file={file} />;
    case 'uncertainty':
      return <UncertaintySection {...shared} />;
    case 'cautions':
      return <CautionsSection {...shared} />;
    case 'citation':
      return <CitationSection {...shared} />;
    case 'versions':
      return <VersionsSection {...shared} code={code} />;
    default:
      return null;
  }
}
