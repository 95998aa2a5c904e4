import { paths } from '../../lib/paths';
import { apiGuideStrings } from '../../strings/api-guide';
import { Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening, Section } from '../../ui/page/section';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { ExampleSection } from './example-section';
import { KeysSection } from './keys-section';

const words = apiGuideStrings;

/** For modellers: the code for a sheet, keys, limits. */
export function ApiGuidePage() {
  return (
    <Page title={words.path} path={[{ name: words.path }]} folio={<span>{words.folio}</span>}>
      <Opening
        small
        title={words.title}
        lead={<Typeset>{words.lead}</Typeset>}
        margin={
          <MarginBlock
            entries={[
              [words.address, paths.explorer()],
              [
                words.explorer,
                <a key="explorer" href={paths.explorer()}>
                  {words.explorerLink}
                </a>,
              ],
              [words.schema, words.schemaWords],
            ]}
          />
        }
      />
      <ExampleSection />
      <KeysSection number={2} />
      <Section number={3} title={words.limits.title} id="limits">
        <DataTable
          label={words.limits.title}
          columns={limitColumns}
          rows={words.limits.rows}
          rowId={(row) => row.what}
          file="diffolio-limits"
        />
      </Section>
    </Page>
  );
}

type Limit = (typeof words.limits.rows)[number];

const limitColumns: DataColumn<Limit>[] = [
  {
    id: 'what',
    head: words.limits.columns.what,
    name: words.limits.columns.what,
    sortable: false,
    value: (row) => row.what,
  },
  {
    id: 'limit',
    head: words.limits.columns.limit,
    name: words.limits.columns.limit,
    numeric: true,
    sortable: false,
    value: (row) => row.limit,
  },
  {
    id: 'note',
    head: words.limits.columns.note,
    name: words.limits.columns.note,
    sortable: false,
    value: (row) => row.note,
  },
];
