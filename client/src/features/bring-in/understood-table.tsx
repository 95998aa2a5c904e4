import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useMemo } from 'react';
import { fill } from '../../lib/fill';
import { formatSigned } from '../../lib/format-quantity';
import { type ReaderUnits, unitLabel, useReaderUnits } from '../../lib/units';
import { bringInStrings } from '../../strings/bring-in';
import { Aligned } from '../../ui/numbers/aligned';
import { Unit } from '../../ui/numbers/num';
import { pastedGridRecipe, tableRecipe } from '../../ui/recipes/table.recipe';
import { type ColumnMapping, type NumberedIssue, type ReadAnswer, type ShownRow } from './answer';
import { cellText, estimateText, percentAgainst, placesIn, SHOWN } from './cells';
import { ColumnHead } from './column-head';

const words = bringInStrings.understood;

interface UnderstoodTableProps {
  readonly answer: ReadAnswer;
  readonly issues: readonly NumberedIssue[];
  readonly onColumn: (index: number, column: ColumnMapping) => void;
}

/** Per column two halves: as brought, and as understood. Doubtful cells are tinted and numbered. */
export function UnderstoodTable({ answer, issues, onColumn }: UnderstoodTableProps) {
  const table = useSlotRecipe({ recipe: tableRecipe })({ dense: true });
  const grid = useSlotRecipe({ recipe: pastedGridRecipe })();
  const units = useReaderUnits();
  const { mapping, columns, rows, estimateLabel } = answer;
  const at = useMemo(() => placesOf(issues), [issues]);
  const places = useMemo(() => {
    const points = rows.flatMap(({ point }) => point ?? []);
    return mapping.columns.map(({ role }) => (SHOWN[role] ? placesIn(SHOWN[role], points, units) : 0));
  }, [mapping, rows, units]);
  const compares = estimateLabel !== null;
  return (
    <chakra.div css={table.scroll} tabIndex={0} role="region" aria-label={words.label} marginTop="16px">
      <chakra.table css={[table.root, grid.root, GRID]}>
        <caption>{words.label}</caption>
        <thead>
          <tr>
            <td />
            {columns.map(({ header }, i) => (
              <chakra.td key={i} colSpan={spanOf(mapping.columns[i])} className="source">
                {header === '' ? words.noHeader : `“${header}”`}
              </chakra.td>
            ))}
            {compares && (
              <chakra.td colSpan={2} className="source compared">
                {words.notYours}
              </chakra.td>
            )}
          </tr>
          <tr>
            <th scope="col" className="n">
              {words.row}
            </th>
            {mapping.columns.map((column, i) => (
              <th key={i} scope="col" colSpan={spanOf(column)}>
                <ColumnHead
                  name={columns[i]?.header || fill(words.column, { n: i + 1 })}
                  column={column}
                  onChange={(next) => onColumn(i, next)}
                />
                <Marks numbers={at.columns.get(i) ?? []} />
              </th>
            ))}
            {compares && <ComparedHeads units={units} />}
          </tr>
        </thead>
        <tbody>
          {rows.map((row, index) => (
            <Row
              key={row.number}
              row={row}
              before={rows[index - 1]}
              after={rows[index + 1]}
              columns={mapping.columns}
              places={places}
              at={at}
              units={units}
              compares={compares}
            />
          ))}
        </tbody>
      </chakra.table>
    </chakra.div>
  );
}

const ComparedHeads = ({ units }: { readonly units: ReaderUnits }) => (
  <>
    <th scope="col" className="n compared">
      {words.estimate}
      <chakra.span display="block" fontWeight={400}>
        <Unit>{unitLabel('diffusivity', units.diffusivity)}</Unit>
      </chakra.span>
    </th>
    <th scope="col" className="n">
      {words.against}
      <chakra.span display="block" fontWeight={400}>
        %
      </chakra.span>
    </th>
  </>
);

interface RowProps {
  readonly row: ShownRow;
  readonly before: ShownRow | undefined;
  readonly after: ShownRow | undefined;
  readonly columns: readonly ColumnMapping[];
  readonly places: readonly number[];
  readonly at: Places;
  readonly units: ReaderUnits;
  readonly compares: boolean;
}

function Row({ row, before, after, columns, places, at, units, compares }: RowProps) {
  const { point, estimate, state } = row;
  const twin = twinOf(row, { before, after, at });
  return (
    <tr data-state={state} {...(twin === null ? {} : { 'data-twin': twin })}>
      <td className="n row">
        {row.number}
        <Marks numbers={at.rows.get(row.number) ?? []} />
      </td>
      {columns.map((column, i) => (
        <Cell
          key={i}
          row={row}
          column={column}
          index={i}
          places={places[i] ?? 0}
          issue={at.cells.get(`${row.number}:${i}`)}
          units={units}
        />
      ))}
      {compares && (
        <>
          <td className="n compared">{estimate === null ? '' : estimateText(estimate, units)}</td>
          <td className="n">{point && estimate !== null ? formatSigned(percentAgainst(point, estimate), 1) : ''}</td>
        </>
      )}
    </tr>
  );
}

interface CellProps {
  readonly row: ShownRow;
  readonly column: ColumnMapping;
  readonly index: number;
  readonly places: number;
  readonly issue: NumberedIssue | undefined;
  readonly units: ReaderUnits;
}

function Cell({ row, column, index, places, issue, units }: CellProps) {
  const styles = useSlotRecipe({ recipe: pastedGridRecipe })();
  const shown = SHOWN[column.role];
  const brought = row.cells[index] ?? '';
  const tint = issue === undefined ? {} : styles.doubt;
  const described = issue === undefined ? {} : { 'aria-describedby': `doubt-${issue.number}` };
  if (shown === undefined) {
    return (
      <chakra.td css={[styles.pasted, tint]} {...described}>
        {brought}
        <Marks numbers={issue === undefined ? [] : [issue.number]} />
      </chakra.td>
    );
  }
  const isOpen = issue !== undefined && issue.issue.decided === null && row.state !== 'LEFT_OUT';
  return (
    <>
      <chakra.td css={[styles.pasted, tint]} data-part="pasted">
        {brought}
      </chakra.td>
      <chakra.td
        css={[styles.understood, tint]}
        data-part="understood"
        {...(isOpen ? { 'data-open': '' } : {})}
        {...described}
      >
        {isOpen ? '?' : row.point && <Aligned places={places}>{cellText(shown, row.point, units, places)}</Aligned>}
        <Marks numbers={issue === undefined ? [] : [issue.number]} />
      </chakra.td>
    </>
  );
}

function Marks({ numbers }: { readonly numbers: readonly number[] }) {
  const styles = useSlotRecipe({ recipe: pastedGridRecipe })();
  return numbers.map((number, i) => (
    <chakra.span key={number} css={styles.number} {...(i > 0 ? { marginRight: `${10 * i}px` } : {})}>
      {number}
    </chakra.span>
  ));
}

interface Places {
  readonly columns: ReadonlyMap<number, number[]>;
  readonly rows: ReadonlyMap<number, number[]>;
  /** `row:column` */
  readonly cells: ReadonlyMap<string, NumberedIssue>;
  /** row of the second of two equal rows, and the row it repeats */
  readonly twins: ReadonlyMap<number, number>;
}

function placesOf(issues: readonly NumberedIssue[]): Places {
  const columns = new Map<number, number[]>();
  const rows = new Map<number, number[]>();
  const cells = new Map<string, NumberedIssue>();
  const twins = new Map<number, number>();
  for (const one of issues) {
    const { row, column, sameAsRow } = one.issue;
    if (row !== null && sameAsRow !== null) twins.set(row, sameAsRow);
    if (row === null && column !== null) columns.set(column, [...(columns.get(column) ?? []), one.number]);
    else if (row !== null && column === null) rows.set(row, [...(rows.get(row) ?? []), one.number]);
    else if (row !== null) cells.set(`${row}:${column}`, one);
  }
  return { columns, rows, cells, twins };
}

/** Two equal rows that follow each other are joined by a bracket. */
function twinOf(
  row: ShownRow,
  { before, after, at }: Pick<RowProps, 'before' | 'after' | 'at'>,
): 'first' | 'second' | null {
  if (before !== undefined && at.twins.get(row.number) === before.number) return 'second';
  return after !== undefined && at.twins.get(after.number) === row.number ? 'first' : null;
}

const spanOf = (column: ColumnMapping | undefined): number => (column !== undefined && SHOWN[column.role] ? 2 : 1);

const bracket = {
  content: '""',
  position: 'absolute',
  right: '4px',
  width: '5px',
  border: '1.4px solid',
  borderColor: 'ink',
  borderRight: 0,
};

const GRID = {
  '& thead .source': {
    color: 'ink3',
    fontSize: '13px',
    lineHeight: '20px',
    padding: '6px 12px 6px 12px',
    borderBottom: '1px solid',
    borderColor: 'rule',
  },
  '& thead th': { verticalAlign: 'top', paddingLeft: '12px', position: 'relative' },
  '& td:not(:first-of-type):not(.n)': { paddingLeft: '12px' },
  // Room for the number of a doubt behind the digits.
  '&& td[data-part=understood]': { paddingLeft: '0', paddingRight: '15px' },
  '& .row': { color: 'ink2', fontSize: '13px', position: 'relative', paddingRight: '18px' },
  // The number of a row stands before it, its bracket behind.
  '& .row > span': { right: 'auto', left: 0 },
  '& .compared': { borderLeft: '1px solid', borderColor: 'rule', paddingLeft: '16px' },
  '& tbody .compared, & tbody .compared + td': { color: 'ink2' },
  '& tr[data-state=LEFT_OUT] td:not(.row)': { color: 'ink3', textDecoration: 'line-through' },
  '& tr[data-twin=first] .row::after': { ...bracket, top: '13px', bottom: 0, borderBottom: 0 },
  '& tr[data-twin=second] .row::after': { ...bracket, top: 0, bottom: '13px', borderTop: 0 },
} as const;
