import { useState, type KeyboardEvent } from 'react';

/**
 * Arrow keys, Home and End walk the rows of a table; Enter opens one. One row at a time is a stop of the Tab key.
 *
 * @param act what another key does to a row; true when it does something
 */
export function useRowKeys(
  count: number,
  open: (index: number) => void,
  act: (index: number, key: string) => boolean = () => false,
) {
  const [current, setCurrent] = useState(0);
  const active = Math.min(current, Math.max(0, count - 1));
  const onKeyDown = (event: KeyboardEvent<HTMLTableSectionElement>) => {
    if (!(event.target instanceof HTMLTableRowElement)) return;
    if (event.key === 'Enter') return open(active);
    const next = nextRow(event.key, active, count);
    if (next === null) {
      if (!event.ctrlKey && !event.metaKey && !event.altKey && act(active, event.key)) event.preventDefault();
      return;
    }
    event.preventDefault();
    setCurrent(next);
    event.currentTarget.querySelectorAll<HTMLTableRowElement>('tr[data-row]')[next]?.focus();
  };
  return {
    body: { onKeyDown },
    row: (index: number) => ({
      'data-row': index,
      tabIndex: index === active ? 0 : -1,
      onFocus: () => setCurrent(index),
    }),
  };
}

function nextRow(key: string, index: number, count: number): number | null {
  if (key === 'ArrowDown') return Math.min(count - 1, index + 1);
  if (key === 'ArrowUp') return Math.max(0, index - 1);
  if (key === 'Home') return 0;
  return key === 'End' ? count - 1 : null;
}
