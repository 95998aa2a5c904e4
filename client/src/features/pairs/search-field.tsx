import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useId } from 'react';
import { pairStrings } from '../../strings/pairs';
import { fieldRecipe } from '../../ui/recipes/control.recipe';

/** Narrows the list while one types. */
export function SearchField({
  value,
  onChange,
}: {
  readonly value: string;
  readonly onChange: (text: string) => void;
}) {
  const styles = useSlotRecipe({ recipe: fieldRecipe })();
  const id = useId();
  return (
    <chakra.search display="block" maxWidth="420px" marginTop="20px">
      <chakra.label css={styles.label} htmlFor={id}>
        {pairStrings.find}
      </chakra.label>
      <chakra.div css={styles.frame}>
        <chakra.input
          css={styles.control}
          id={id}
          type="search"
          autoComplete="off"
          value={value}
          aria-describedby={`${id}-hint`}
          onChange={(event) => onChange(event.target.value)}
        />
      </chakra.div>
      <chakra.p css={styles.hint} id={`${id}-hint`}>
        {pairStrings.findHint}
      </chakra.p>
    </chakra.search>
  );
}
