import { chakra, type SystemStyleObject } from '@chakra-ui/react';
import { type SortingState } from '@tanstack/react-table';
import { cellClass, type DataColumn } from './column';

interface TableHeadProps<R> {
  readonly columns: readonly DataColumn<R>[];
  readonly sorting: SortingState;
  readonly onSort: (id: string) => void;
  readonly styles: Readonly<Record<'sort' | 'unit', SystemStyleObject>>;
}

/** Heads are the sort buttons; the unit stands on a line of its own. */
export function TableHead<R>({ columns, sorting, onSort, styles }: TableHeadProps<R>) {
  const [sorted] = sorting;
  return (
    <thead>
      <tr>
        {columns.map((column) => {
          const direction = sorted?.id === column.id ? (sorted.desc ? 'descending' : 'ascending') : 'none';
          const sortable = column.sortable ?? true;
          return (
            <th
              key={column.id}
              scope="col"
              className={cellClass(column)}
              {...(sortable ? { 'aria-sort': direction } : {})}
            >
              {sortable ? (
                <chakra.button type="button" css={styles.sort} onClick={() => onSort(column.id)}>
                  {column.head}
                  {direction !== 'none' && <span aria-hidden>{direction === 'ascending' ? '\u00a0↑' : '\u00a0↓'}</span>}
                </chakra.button>
              ) : (
                column.head
              )}
              {column.unit !== undefined && <chakra.span css={styles.unit}>{column.unit}</chakra.span>}
            </th>
          );
        })}
      </tr>
    </thead>
  );
}
