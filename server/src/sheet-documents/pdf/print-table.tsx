import { Text, View } from '@react-pdf/renderer';
import type { ReactNode } from 'react';
import type { TextRun } from '../typeset.types.js';
import { styles } from './print-layout.js';
import { Runs } from './typeset-text.js';

export interface PrintColumn {
  readonly head: readonly TextRun[];
  /** Under the head, on a line of its own; empty where there is none */
  readonly unit: string;
  /** Share of the width that is left, or points */
  readonly width: { readonly share: number } | { readonly points: number };
  readonly isNumeric: boolean;
}

export interface PrintRow {
  readonly cells: readonly ReactNode[];
  /** A line below, over the whole width but the first column */
  readonly note?: ReactNode;
  readonly isStrong?: boolean;
}

const TABULAR = { fontFeatureSettings: ['tnum'] };
const NUMERIC = { ...TABULAR, textAlign: 'right' } as const;
const GAP = 7;

const widthOf = ({ width }: PrintColumn) => ('share' in width ? { flex: width.share } : { width: width.points });
const cellStyle = (column: PrintColumn, isLast: boolean) => [
  widthOf(column),
  { paddingRight: isLast ? 0 : GAP },
  column.isNumeric ? NUMERIC : TABULAR,
];

interface PrintTableProps {
  readonly columns: readonly PrintColumn[];
  readonly rows: readonly PrintRow[];
  /** Further rows under a title of their own, in the same columns */
  readonly more?: readonly { readonly title: string; readonly rows: readonly PrintRow[] }[];
  /** A hairline after each fifth row */
  readonly isLong?: boolean;
}

/** The table of the printed sheet: heavy rules above and below, units under the heads, figures aligned. */
export function PrintTable({ columns, rows, more = [], isLong = false }: PrintTableProps) {
  return (
    <View style={styles.table}>
      <View style={styles.tableHead} wrap={false}>
        {columns.map((column, i) => (
          <View key={i} style={cellStyle(column, i === columns.length - 1)}>
            <Text>
              <Runs runs={column.head} size={7.8} />
            </Text>
            {column.unit !== '' && <Text style={styles.tableUnit}>{column.unit}</Text>}
          </View>
        ))}
      </View>
      {rows.map((row, i) => (
        <TableRow key={i} columns={columns} row={row} isFifth={isLong && i % 5 === 4 && i < rows.length - 1} />
      ))}
      {more.map(({ title, rows: moreRows }) => (
        <View key={title}>
          <Text style={styles.tableTitle} minPresenceAhead={24}>
            {title}
          </Text>
          {moreRows.map((row, i) => (
            <TableRow key={i} columns={columns} row={row} isFifth={false} />
          ))}
        </View>
      ))}
    </View>
  );
}

interface TableRowProps {
  readonly columns: readonly PrintColumn[];
  readonly row: PrintRow;
  readonly isFifth: boolean;
}

function TableRow({ columns, row, isFifth }: TableRowProps) {
  const [first] = columns;
  return (
    <View wrap={false} style={isFifth ? styles.tableFifthRow : {}}>
      <View style={[styles.tableRow, row.isStrong === true ? styles.tableStrongRow : {}]}>
        {columns.map((column, i) => {
          const cell = row.cells[i];
          const style = cellStyle(column, i === columns.length - 1);
          return typeof cell === 'string' ? (
            <Text key={i} style={style}>
              {cell}
            </Text>
          ) : (
            <View key={i} style={style}>
              {cell}
            </View>
          );
        })}
      </View>
      {row.note !== undefined && (
        <View style={{ flexDirection: 'row' }}>
          {first !== undefined && <View style={widthOf(first)} />}
          <Text style={[styles.tableNote, { flex: 1 }]}>{row.note}</Text>
        </View>
      )}
    </View>
  );
}
