import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useRef, type ClipboardEvent, type KeyboardEvent } from 'react';
import { fill } from '../../lib/fill';
import { bringInStrings } from '../../strings/bring-in';
import { Typeset } from '../../ui/numbers/typeset';
import { tableRecipe } from '../../ui/recipes/table.recipe';
import { HeadSelect } from './head-select';
import { cellsOf, TYPED_COLUMNS, type TypedGrid as Grid, withCells } from './typed-table';

const words = bringInStrings.table;
/** The header is row 1, as in a spreadsheet. */
const FIRST_ROW = 2;

interface TypedGridProps {
  readonly grid: Grid;
  readonly onChange: (grid: Grid) => void;
}

const plain = (typeset: string): string => typeset.replaceAll('*', '');

/** A grid to type points into: Enter and arrow keys walk it, cells of a spreadsheet can be pasted anywhere. */
export function TypedGrid({ grid, onChange }: TypedGridProps) {
  const styles = useSlotRecipe({ recipe: tableRecipe })({ dense: true });
  const body = useRef<HTMLTableSectionElement>(null);
  const focus = (row: number, column: number) =>
    body.current?.querySelector<HTMLInputElement>(`[data-cell="${row}:${column}"]`)?.focus();
  const walk = (event: KeyboardEvent<HTMLInputElement>, row: number, column: number) => {
    const by = event.key === 'ArrowDown' || event.key === 'Enter' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
    if (by === 0) return;
    event.preventDefault();
    focus(row + by, column);
  };
  const paste = (event: ClipboardEvent<HTMLInputElement>, row: number, column: number) => {
    const cells = cellsOf(event.clipboardData.getData('text'));
    if (cells.length === 1 && cells[0]?.length === 1) return;
    event.preventDefault();
    onChange(withCells(grid, row, column, cells));
  };
  return (
    <chakra.div css={styles.scroll} marginTop="14px">
      <chakra.table css={styles.root} maxWidth="640px">
        <caption>{words.gridLabel}</caption>
        <thead>
          <tr>
            <th scope="col" className="n">
              {words.row}
            </th>
            {TYPED_COLUMNS.map(({ key, units }, column) => (
              <th key={key} scope="col">
                <Typeset>{words.names[key]}</Typeset>
                {units.length > 0 && (
                  <HeadSelect
                    label={fill(words.unitOf, { column: plain(words.names[key]) })}
                    value={grid.units[column] ?? ''}
                    choices={units.map((unit) => [unit, unit] as const)}
                    onChange={(unit) =>
                      onChange({ ...grid, units: grid.units.map((one, i) => (i === column ? unit : one)) })
                    }
                  />
                )}
              </th>
            ))}
          </tr>
        </thead>
        <tbody ref={body}>
          {grid.rows.map((row, i) => (
            <tr key={i}>
              <chakra.td className="n" color="ink2">
                {i + FIRST_ROW}
              </chakra.td>
              {TYPED_COLUMNS.map(({ key }, column) => (
                <td key={key}>
                  <chakra.input
                    css={CELL}
                    data-cell={`${i}:${column}`}
                    aria-label={fill(words.cell, { column: plain(words.names[key]), row: i + FIRST_ROW })}
                    inputMode="decimal"
                    autoComplete="off"
                    value={row[column] ?? ''}
                    onChange={(event) => onChange(withCells(grid, i, column, [[event.target.value]]))}
                    onKeyDown={(event) => walk(event, i, column)}
                    onPaste={(event) => paste(event, i, column)}
                  />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </chakra.table>
    </chakra.div>
  );
}

const CELL = {
  width: '100%',
  minWidth: '76px',
  background: 'none',
  borderBottom: '1px solid',
  borderColor: 'control',
  lineHeight: '24px',
  _focusVisible: { outline: 'none', borderColor: 'accent', boxShadow: '0 1px 0 var(--dfl-colors-accent)' },
} as const;
