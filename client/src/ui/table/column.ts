import { type ReactNode } from 'react';

/** One column: how it is headed, what it is sorted, filtered and copied by, and how a cell is set. */
export interface DataColumn<R> {
  readonly id: string;
  readonly head: ReactNode;
  /** On a line of its own under the head. */
  readonly unit?: ReactNode;
  /** Head and unit as plain text, for copies and CSV. */
  readonly name: string;
  readonly value: (row: R) => string | number | null;
  /** The cell as set; its value when absent. */
  readonly cell?: (row: R) => ReactNode;
  readonly numeric?: boolean;
  readonly sortable?: boolean;
  /** Left away on a narrow screen until all columns are asked for. */
  readonly wideOnly?: boolean;
  readonly className?: string;
}

/** Classes of a column's cells. */
export function cellClass<R>(column: DataColumn<R>): string | undefined {
  return (
    [column.numeric ? 'n' : '', column.wideOnly ? 'wide-only' : '', column.className ?? ''].filter(Boolean).join(' ') ||
    undefined
  );
}
