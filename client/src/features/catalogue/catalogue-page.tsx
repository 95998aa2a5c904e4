import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { parseNumber } from '../../lib/parse-number';
import { paths } from '../../lib/paths';
import { toSi, unitLabel, useReaderUnits } from '../../lib/units';
import { catalogueStrings } from '../../strings/catalogue';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { SentenceField } from '../../ui/form/sentence-field';
import { Filter } from '../../ui/form/views';
import { Quantity, quantityText } from '../../ui/numbers/quantity';
import { Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening, Section } from '../../ui/page/section';
import { catalogueRows, commonGases, type CatalogueRow } from './catalogue-row';
import { CatalogueNews } from './catalogue-news';
import { SearchForm } from './search-form';
import { searchWords, type SearchWords } from './search-words';
import { SheetList } from './sheet-list';
import { useAllSheets } from './use-all-sheets';

const words = catalogueStrings;

/** The catalogue: search, the released sheets, what is new and what was withdrawn. */
export function CataloguePage({ search }: { readonly search: string }) {
  const asked = searchWords(search);
  const { data, error, refetch } = useAllSheets(asked.words);
  const rows = data ? catalogueRows(data.dataSheets.edges.map(({ node }) => node)) : null;
  const count = rows?.length ?? 0;
  return (
    <Page
      title={words.window}
      path={[{ name: words.path }]}
      folio={rows && <span>{count === 1 ? words.oneSheet : fill(words.count, { count })}</span>}
    >
      <Opening title={words.title} lead={<Typeset>{words.lead}</Typeset>} margin={<CatalogueNews />}>
        <SearchForm key={search} search={search} />
      </Opening>
      <Section
        number={1}
        title={search === '' ? words.section : fill(words.found, { search: asked.words })}
        id="sheets"
        margin={<ReadingTheList />}
      >
        {error && !data && <Failed what={words.failed} why={errorMessage(error)} onRetry={() => void refetch()} />}
        {!rows && !error && <Loading what={words.what} />}
        {rows &&
          (rows.length === 0 ? <Nothing searched={search !== ''} /> : <FilteredSheets rows={rows} asked={asked} />)}
      </Section>
    </Page>
  );
}

const Nothing = ({ searched }: { readonly searched: boolean }) => (
  <Empty sentence={searched ? words.nothing : words.empty}>
    <Link to={paths.catalogue()}>{words.all}</Link>
  </Empty>
);

const ANY = '';

function FilteredSheets({ rows, asked }: { readonly rows: readonly CatalogueRow[]; readonly asked: SearchWords }) {
  const units = useReaderUnits();
  const [gas, setGas] = useState(ANY);
  const [holdsAt, setHoldsAt] = useState('');
  const typed = parseNumber(holdsAt);
  const kelvin = typed === null ? null : toSi('temperature', typed, units.temperature);
  const gases = commonGases(rows);
  const shown = rows.filter(
    (row) =>
      (gas === ANY || row.substances.some(({ name }) => name === gas)) &&
      (kelvin === null || (row.temperatureMinimum <= kelvin && kelvin <= row.temperatureMaximum)),
  );
  return (
    <>
      <chakra.div marginTop="10px" display="grid" gap="2px" textStyle="small">
        {gases.length > 0 && (
          <Filter
            lead={words.filters.in}
            options={[{ value: ANY, label: words.filters.any }, ...gases.map((name) => ({ value: name, label: name }))]}
            value={gas}
            onChange={setGas}
          />
        )}
        <chakra.p display="flex" gap="16px" alignItems="baseline" color="ink2">
          <chakra.span color="ink3">{words.filters.holdsAt}</chakra.span>
          <SentenceField
            label={words.filters.temperature}
            value={holdsAt}
            onChange={setHoldsAt}
            invalid={holdsAt !== '' && kelvin === null}
            unit={<span>{`\u00a0${unitLabel('temperature', units.temperature)}`}</span>}
          />
        </chakra.p>
      </chakra.div>
      <AskedState asked={asked} />
      <SheetList rows={shown} state={stateQuery(asked)} />
    </>
  );
}

function AskedState({ asked: { temperature, pressure } }: { readonly asked: SearchWords }) {
  const units = useReaderUnits();
  if (temperature === null || pressure === null) return null;
  return (
    <chakra.p textStyle="small" color="ink2" marginTop="8px">
      {fill(words.stateAsked, {
        temperature: quantityText('temperature', temperature, units.temperature),
        pressure: quantityText('pressure', pressure, units.pressure),
      })}
    </chakra.p>
  );
}

/** In K and kPa, as the address of a sheet takes it. */
function stateQuery({ temperature, pressure }: SearchWords): string {
  const parts = [
    temperature === null ? null : `T=${temperature}`,
    pressure === null ? null : `P=${pressure / 1000}`,
  ].filter((part) => part !== null);
  return parts.length === 0 ? '' : `?${parts.join('&')}`;
}

function ReadingTheList() {
  return (
    <>
      <MarginBlock title={words.reading}>
        <p>
          <Typeset>{words.readingD0}</Typeset> <Quantity kind="temperature" value={298.15} />,{' '}
          <Quantity kind="pressure" value={101_325} />.
        </p>
        <p>
          <Typeset>{words.readingLaw}</Typeset>
        </p>
        <p>{words.readingRule}</p>
      </MarginBlock>
      <MarginBlock title={words.code}>
        <p>
          <Link to={paths.apiGuide()}>{words.codeLink}</Link>
          {words.codeWords}
        </p>
      </MarginBlock>
    </>
  );
}
