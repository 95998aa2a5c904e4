import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { type KeyboardEvent, type ReactNode } from 'react';
import { viewsRecipe } from '../recipes/control.recipe';

interface Option<T extends string> {
  readonly value: T;
  readonly label: ReactNode;
}

interface ViewsProps<T extends string> {
  readonly label: string;
  readonly options: readonly Option<T>[];
  readonly value: T;
  readonly onChange: (value: T) => void;
  /** Id of the panel that the view fills. */
  readonly controls: string;
  /** Stands at the right end: tools of the panel. */
  readonly children?: ReactNode;
}

/** Views of one thing: underlined words, arrow keys move between them. */
export function Views<T extends string>({ label, options, value, onChange, controls, children }: ViewsProps<T>) {
  const styles = useSlotRecipe({ recipe: viewsRecipe })({ kind: 'views' });
  const move = (event: KeyboardEvent<HTMLElement>) => {
    const by = event.key === 'ArrowRight' ? 1 : event.key === 'ArrowLeft' ? -1 : 0;
    if (by === 0) return;
    event.preventDefault();
    const next = (options.findIndex((option) => option.value === value) + by + options.length) % options.length;
    onChange(options[next]!.value);
    event.currentTarget.querySelectorAll<HTMLElement>('[role=tab]')[next]?.focus();
  };
  return (
    <chakra.div css={styles.root}>
      <chakra.div role="tablist" aria-label={label} display="contents" onKeyDown={move}>
        {options.map((option) => (
          <chakra.button
            key={option.value}
            type="button"
            role="tab"
            css={styles.option}
            aria-selected={option.value === value}
            aria-controls={controls}
            tabIndex={option.value === value ? 0 : -1}
            onClick={() => onChange(option.value)}
          >
            {option.label}
          </chakra.button>
        ))}
      </chakra.div>
      <chakra.span css={styles.space} />
      {children}
    </chakra.div>
  );
}

interface FilterProps<T extends string> {
  /** The preposition that leads it: “in”, “carried by”. */
  readonly lead: string;
  readonly options: readonly Option<T>[];
  readonly value: T;
  readonly onChange: (value: T) => void;
}

/** One filter: words, one of them pressed. */
export function Filter<T extends string>({ lead, options, value, onChange }: FilterProps<T>) {
  const styles = useSlotRecipe({ recipe: viewsRecipe })({ kind: 'filters' });
  return (
    <chakra.div css={styles.root} role="group" aria-label={lead}>
      <chakra.span css={styles.label} aria-hidden>
        {lead}
      </chakra.span>
      {options.map((option) => (
        <chakra.button
          key={option.value}
          type="button"
          css={styles.option}
          aria-pressed={option.value === value}
          onClick={() => onChange(option.value)}
        >
          {option.label}
        </chakra.button>
      ))}
    </chakra.div>
  );
}
