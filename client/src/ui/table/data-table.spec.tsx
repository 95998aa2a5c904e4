import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { WithProviders } from '../test/with-providers';
import { DataTable, type DataColumn } from './data-table';

interface Point {
  readonly series: string;
  readonly temperature: number;
}

const columns: DataColumn<Point>[] = [
  { id: 'series', head: 'Series', name: 'Series', value: (row) => row.series },
  { id: 'T', head: 'T', unit: 'K', name: 'T / K', numeric: true, value: (row) => row.temperature },
];
const rows: Point[] = [
  { series: 'b', temperature: 323.15 },
  { series: 'a', temperature: 298.15 },
  { series: 'c', temperature: 1100 },
];

function show(more: Partial<Parameters<typeof DataTable<Point>>[0]> = {}) {
  render(
    <WithProviders>
      <DataTable label="Points" columns={columns} rows={rows} rowId={(row) => row.series} file="points" {...more} />
    </WithProviders>,
  );
  return userEvent.setup();
}

const firstColumn = () =>
  screen
    .getAllByRole('row')
    .slice(1)
    .map((row) => within(row).getAllByRole('cell')[0]?.textContent);

describe('the table', () => {
  it('stands in the order given until a head is pressed, then up, then down, then as it came', async () => {
    const user = show();
    const head = screen.getByRole('button', { name: /^T/ });
    expect(firstColumn()).toEqual(['b', 'a', 'c']);
    await user.click(head);
    expect(firstColumn()).toEqual(['a', 'b', 'c']);
    expect(screen.getByRole('columnheader', { name: /^T/ })).toHaveAttribute('aria-sort', 'ascending');
    await user.click(head);
    expect(firstColumn()).toEqual(['c', 'b', 'a']);
    await user.click(head);
    expect(firstColumn()).toEqual(['b', 'a', 'c']);
  });

  it('shows the rows that hold what is typed into the filter', async () => {
    const user = show({ filterable: true });
    await user.type(screen.getByLabelText('Filter'), '323');
    expect(firstColumn()).toEqual(['b']);
    await user.clear(screen.getByLabelText('Filter'));
    await user.type(screen.getByLabelText('Filter'), 'nothing');
    expect(screen.getByText('No row matches the filter.')).toBeVisible();
  });

  it('is walked by arrow keys and opened by Enter', async () => {
    const onOpen = vi.fn();
    const user = show({ onOpen });
    screen.getAllByRole('row')[1]?.focus();
    await user.keyboard('{ArrowDown}{ArrowDown}{ArrowUp}{Enter}');
    expect(onOpen).toHaveBeenCalledExactlyOnceWith(rows[1]);
  });

  it('copies what is shown, in the order it is shown', async () => {
    const user = show();
    const write = vi.spyOn(navigator.clipboard, 'writeText');
    await user.click(screen.getByRole('button', { name: /^T/ }));
    await user.click(screen.getByRole('button', { name: 'Copy: Points' }));
    expect(write).toHaveBeenCalledWith('Series\tT / K\na\t298.15\nb\t323.15\nc\t1100');
    expect(screen.getByText('Copied.')).toBeVisible();
  });

  it('says why a row was left out on a second line', () => {
    show({ secondLine: (row) => row.series === 'c' && 'tubes too short' });
    expect(screen.getByText('tubes too short')).toBeVisible();
  });
});
