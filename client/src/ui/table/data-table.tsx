import { chakra, useSlotRecipe } from '@chakra-ui/react';
import {
  columnFilteringFeature,
  createColumnHelper,
  createFilteredRowModel,
  createSortedRowModel,
  filterFn_includesString,
  globalFilteringFeature,
  rowSortingFeature,
  sortFn_alphanumeric,
  sortFn_basic,
  tableFeatures,
  useTable,
  type SortingState,
} from '@tanstack/react-table';
import { Fragment, useMemo, useState, type ReactNode } from 'react';
import { uiStrings } from '../../strings/ui';
import { tableRecipe } from '../recipes/table.recipe';
import { cellClass, type DataColumn } from './column';
import { TableHead } from './table-head';
import { TableTools } from './table-tools';
import { useRowKeys } from './use-row-keys';

export { type DataColumn } from './column';

interface DataTableProps<R> {
  /** What the table holds, for those who hear it. */
  readonly label: string;
  readonly columns: readonly DataColumn<R>[];
  readonly rows: readonly R[];
  readonly rowId: (row: R) => string;
  /** Stem of the name of the CSV file. */
  readonly file: string;
  readonly emphasised?: (row: R) => boolean;
  /** A second line under a row: the reason it was left out. */
  readonly secondLine?: (row: R) => ReactNode;
  /** Enter on a row. */
  readonly onOpen?: (row: R) => void;
  /** Any other key on a row; true when it does something. */
  readonly onKey?: (row: R, key: string) => boolean;
  readonly filterable?: boolean;
  readonly empty?: ReactNode;
  /** More words after “Copy, CSV”. */
  readonly tools?: ReactNode;
  readonly className?: string;
}

const features = tableFeatures({
  rowSortingFeature,
  columnFilteringFeature,
  globalFilteringFeature,
  sortedRowModel: createSortedRowModel(),
  filteredRowModel: createFilteredRowModel(),
  sortFns: { alphanumeric: sortFn_alphanumeric, basic: sortFn_basic },
  filterFns: { includesString: filterFn_includesString },
});

/** The one table: sorted by its heads, filtered, walked by arrow keys, copied and saved as CSV. */
export function DataTable<R extends object>(props: DataTableProps<R>) {
  const { label, columns, rows, rowId, file, filterable = rows.length > 12 } = props;
  const [sorting, setSorting] = useState<SortingState>([]);
  const [filter, setFilter] = useState('');
  const [allColumns, setAllColumns] = useState(false);
  const styles = useSlotRecipe({ recipe: tableRecipe })({ allColumns });
  const definitions = useMemo(() => definitionsOf(columns), [columns]);
  const table = useTable({
    features,
    columns: definitions,
    data: rows,
    getRowId: rowId,
    state: { sorting, globalFilter: filter },
    onSortingChange: setSorting,
    onGlobalFilterChange: setFilter,
    globalFilterFn: 'includesString',
    enableSortingRemoval: true,
  });
  const shown = table.getRowModel().rows;
  const keys = useRowKeys(
    shown.length,
    (index) => shown[index] && props.onOpen?.(shown[index].original),
    (index, key) => (shown[index] && props.onKey?.(shown[index].original, key)) ?? false,
  );
  const plain = () => ({
    head: columns.map((column) => column.name),
    rows: shown.map(({ original }) => columns.map((column) => column.value(original))),
  });

  return (
    <div className={props.className}>
      <chakra.div css={styles.scroll}>
        <chakra.table css={styles.root}>
          <caption>{label}</caption>
          <TableHead
            columns={columns}
            sorting={sorting}
            onSort={(id) => setSorting((now) => nextSorting(now, id))}
            styles={styles}
          />
          <tbody {...keys.body}>
            {shown.map((row, index) => (
              <Fragment key={row.id}>
                <tr
                  className={rowClass(props.emphasised?.(row.original) ?? false, index, props.secondLine === undefined)}
                  {...keys.row(index)}
                >
                  {columns.map((column) => (
                    <td key={column.id} className={cellClass(column)}>
                      {column.cell ? column.cell(row.original) : column.value(row.original)}
                    </td>
                  ))}
                </tr>
                <SecondLine span={columns.length}>{props.secondLine?.(row.original)}</SecondLine>
              </Fragment>
            ))}
          </tbody>
        </chakra.table>
      </chakra.div>
      {shown.length === 0 && (
        <chakra.p textStyle="small" color="ink2" marginTop="10px">
          {filter === '' ? props.empty : uiStrings.nothingMatches}
        </chakra.p>
      )}
      <TableTools
        styles={styles}
        label={label}
        file={file}
        plain={plain}
        filter={filterable ? filter : null}
        onFilter={setFilter}
        {...(columns.some((column) => column.wideOnly) ? { allColumns, onAllColumns: setAllColumns } : {})}
      >
        {props.tools}
      </TableTools>
    </div>
  );
}

function definitionsOf<R extends object>(columns: readonly DataColumn<R>[]) {
  const helper = createColumnHelper<typeof features, R>();
  return helper.columns(
    columns.map((column) =>
      helper.accessor((row) => column.value(row), {
        id: column.id,
        sortFn: column.numeric ? 'basic' : 'alphanumeric',
        sortUndefined: 'last',
      }),
    ),
  );
}

/** Up, then down, then as it came. */
function nextSorting(now: SortingState, id: string): SortingState {
  const [first] = now;
  if (first?.id !== id) return [{ id, desc: false }];
  return first.desc ? [] : [{ id, desc: true }];
}

const SecondLine = ({ span, children }: { readonly span: number; readonly children: ReactNode }) =>
  children === null || children === undefined || children === false ? null : (
    <tr className="second">
      <td colSpan={span}>{children}</td>
    </tr>
  );

const rowClass = (emphasised: boolean, index: number, hairlines: boolean) =>
  [emphasised ? 'emphasis' : '', hairlines && index > 0 && index % 5 === 0 ? 'fifth' : ''].filter(Boolean).join(' ') ||
  undefined;
