import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { sentenceFieldRecipe } from '../recipes/control.recipe';

interface SentenceFieldProps {
  readonly label: string;
  readonly value: string;
  readonly onChange: (text: string) => void;
  readonly invalid: boolean;
  /** Stands inside the same underline. */
  readonly unit: ReactNode;
}

/** A number inside a sentence, its unit within the same underline. */
export function SentenceField({ label, value, onChange, invalid, unit }: SentenceFieldProps) {
  const styles = useSlotRecipe({ recipe: sentenceFieldRecipe })({ invalid });
  return (
    <chakra.span css={styles.frame}>
      <chakra.input
        css={styles.input}
        aria-label={label}
        aria-invalid={invalid || undefined}
        inputMode="decimal"
        autoComplete="off"
        value={value}
        onChange={(event) => onChange(event.target.value)}
      />
      {unit}
    </chakra.span>
  );
}

interface SentenceUnitProps<U extends string> {
  readonly label: string;
  readonly value: U;
  readonly table: Readonly<Record<string, { readonly label: string }>>;
  readonly onChange: (unit: string) => void;
  /** Has an underline of its own. */
  readonly framed?: boolean;
}

/** The unit of a field in a sentence, to be chosen. */
export function SentenceUnit<U extends string>({
  label,
  value,
  table,
  onChange,
  framed = false,
}: SentenceUnitProps<U>) {
  const styles = useSlotRecipe({ recipe: sentenceFieldRecipe })();
  const select = (
    <chakra.select
      css={styles.select}
      aria-label={label}
      value={value}
      onChange={(event) => onChange(event.target.value)}
    >
      {Object.entries(table).map(([unit, { label: name }]) => (
        <option key={unit} value={unit}>
          {name}
        </option>
      ))}
    </chakra.select>
  );
  return framed ? <chakra.span css={styles.frame}>{select}</chakra.span> : select;
}
