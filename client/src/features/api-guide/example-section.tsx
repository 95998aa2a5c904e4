import { useQuery } from '@apollo/client/react';
import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import {
  ExampleAnswerDocument,
  SheetsToChooseDocument,
  VersionsToChooseDocument,
  type VersionsToChooseQuery,
} from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { paths } from '../../lib/paths';
import { apiGuideStrings } from '../../strings/api-guide';
import { Code } from '../../ui/code';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { WordButton } from '../../ui/form/button';
import { SentenceUnit } from '../../ui/form/sentence-field';
import { Views } from '../../ui/form/views';
import { rangeText } from '../../ui/numbers/quantity';
import { Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Section } from '../../ui/page/section';
import { codeExample, LANGUAGES, statesInside, type ExampleRequest, type Language } from './code-examples';

const words = apiGuideStrings.atHand;
type Version = NonNullable<VersionsToChooseQuery['dataSheet']>['versions'][number];

/** Code for the sheet at hand, and what the service answers to it now. */
export function ExampleSection() {
  const [search, setSearch] = useSearchParams();
  const sheets = useQuery(SheetsToChooseDocument);
  const nodes = (sheets.data?.dataSheets.edges ?? []).map(({ node }) => node).filter((node) => node.current);
  const code = search.get('sheet') ?? nodes[0]?.code ?? null;
  const chosen = useQuery(VersionsToChooseDocument, { variables: { code: code ?? '' }, skip: code === null });
  const versions = (chosen.data?.dataSheet?.versions ?? []).filter(
    ({ status }) => status === 'RELEASED' || status === 'SUPERSEDED' || status === 'WITHDRAWN',
  );
  const current = nodes.find((node) => node.code === code)?.current?.number;
  const version =
    versions.find(({ number }) => number === search.get('version')) ??
    versions.find(({ number }) => number === current) ??
    versions[0];
  const names = Object.fromEntries(
    nodes.map((node) => [
      node.code,
      { label: `${node.pair.substances.map(({ name }) => name).join(' + ')}, ${node.code}` },
    ]),
  );
  const numbers = Object.fromEntries(
    versions.map(({ number, status }) => [number, { label: `${number}, ${status.toLowerCase()}` }]),
  );
  const choose = (sheet: string, number?: string) =>
    setSearch(number === undefined ? { sheet } : { sheet, version: number }, { replace: true });
  return (
    <Section number={1} title={words.title} id="example" tight margin={<ExampleMargin version={version} />}>
      {sheets.error && (
        <Failed what={apiGuideStrings.failed} why={errorMessage(sheets.error)} onRetry={() => void sheets.refetch()} />
      )}
      {!sheets.data && !sheets.error && <Loading what={apiGuideStrings.what} />}
      {sheets.data && nodes.length === 0 && <Empty sentence={apiGuideStrings.none} />}
      {code !== null && version && (
        <>
          <chakra.p
            textStyle="control"
            color="ink2"
            marginTop="6px"
            display="flex"
            flexWrap="wrap"
            gap="4px 10px"
            alignItems="baseline"
          >
            {words.sheet}{' '}
            <SentenceUnit framed label={words.sheet} value={code} table={names} onChange={(sheet) => choose(sheet)} />
            {words.version.toLowerCase()}{' '}
            <SentenceUnit
              framed
              label={words.version}
              value={version.number}
              table={numbers}
              onChange={(number) => choose(code, number)}
            />
          </chakra.p>
          <Example
            request={{
              origin: location.origin,
              code,
              number: version.number,
              ...statesInside(version.correlation.validity),
            }}
          />
        </>
      )}
    </Section>
  );
}

function Example({ request }: { readonly request: ExampleRequest }) {
  const [language, setLanguage] = useState<Language>('curl');
  const [copied, setCopied] = useState(false);
  const text = codeExample(language, request);
  const copy = async () => {
    await navigator.clipboard.writeText(text);
    setCopied(true);
  };
  return (
    <>
      <Views
        label={words.languages}
        options={LANGUAGES.map((name) => ({ value: name, label: name }))}
        value={language}
        onChange={(next) => {
          setLanguage(next);
          setCopied(false);
        }}
        controls="example-code"
      >
        <span role="status">{copied ? words.copied : ''}</span>
        <WordButton quiet onClick={() => void copy()}>
          {words.copy}
        </WordButton>
      </Views>
      <div id="example-code" role="tabpanel" aria-label={language}>
        <Code marked={[request.code, `"${request.number}"`, `'${request.number}'`]} label={language}>
          {text}
        </Code>
      </div>
      <Answer request={request} />
    </>
  );
}

function Answer({ request: { code, number, temperatures, pressure } }: { readonly request: ExampleRequest }) {
  const { data, error } = useQuery(ExampleAnswerDocument, {
    variables: { code, number, T: [...temperatures], P: [pressure] },
  });
  return (
    <>
      <chakra.h3 textStyle="subsection" marginTop="18px">
        {words.answer}
      </chakra.h3>
      {error && <Failed what={words.noAnswer} why={errorMessage(error)} />}
      {!data && !error && <Loading what={words.loading} />}
      {data && <Code label={words.answer}>{answerText(data)}</Code>}
      <chakra.p textStyle="caption" color="ink2" marginTop="8px">
        {words.asOn} <Link to={paths.version(code, number)}>{words.sheetLink}</Link>.
      </chakra.p>
    </>
  );
}

/** The answer as it travels, without what this page's own client adds. */
function answerText(data: object): string {
  const plain = (key: string, value: unknown): unknown => (key === '__typename' ? undefined : value);
  return JSON.stringify({ data }, plain, 2).replace(
    /\[\n\s+([^\]]*?)\n\s+\]/g,
    (_, inner: string) => `[${inner.replace(/\n\s+/g, ' ')}]`,
  );
}

function ExampleMargin({ version }: { readonly version: Version | undefined }) {
  const validity = version?.correlation.validity;
  return (
    <>
      {validity && (
        <MarginBlock title={apiGuideStrings.outside}>
          <p>
            <Typeset>
              {fill(apiGuideStrings.outsideWords, {
                temperature: rangeText('temperature', validity.temperatureMinimum, validity.temperatureMaximum, 'K'),
                pressure: rangeText('pressure', validity.pressureMinimum, validity.pressureMaximum, 'Pa'),
              })}
            </Typeset>
          </p>
        </MarginBlock>
      )}
      <MarginBlock title={apiGuideStrings.decide}>
        <p>{apiGuideStrings.decideWords}</p>
        <p>{apiGuideStrings.overHttp}</p>
      </MarginBlock>
    </>
  );
}
