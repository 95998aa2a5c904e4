import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { sentenceFieldRecipe } from '../../ui/recipes/control.recipe';

interface HeadSelectProps<T extends string> {
  readonly label: string;
  readonly value: T;
  readonly choices: readonly (readonly [value: T, name: string])[];
  readonly onChange: (value: T) => void;
  /** The quantity of a column: heavier than its unit. */
  readonly strong?: boolean;
}

/** A choice in the head of a column. */
export function HeadSelect<T extends string>({ label, value, choices, onChange, strong = false }: HeadSelectProps<T>) {
  const styles = useSlotRecipe({ recipe: sentenceFieldRecipe })();
  return (
    <chakra.span css={styles.frame} display="flex" width="max-content" maxWidth="100%" lineHeight="24px">
      <chakra.select
        css={styles.select}
        aria-label={label}
        value={value}
        fontSize={strong ? '14px' : '13px'}
        fontWeight={strong ? 600 : 400}
        color={strong ? 'ink' : 'ink2'}
        paddingLeft="0"
        // As wide as what is chosen, not as the longest choice, where the browser can.
        fieldSizing="content"
        onChange={(event) => {
          const chosen = choices.find(([one]) => one === event.target.value);
          if (chosen) onChange(chosen[0]);
        }}
      >
        {choices.map(([one, name]) => (
          <option key={one} value={one}>
            {name}
          </option>
        ))}
      </chakra.select>
    </chakra.span>
  );
}
