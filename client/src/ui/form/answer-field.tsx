import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useId, type ReactNode } from 'react';
import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';
import { fieldRecipe } from '../recipes/control.recipe';
import { type Choice } from './field';

interface AnswerFieldProps<V extends FieldValues, N extends FieldPath<V>, T extends FieldValues = V> {
  readonly control: Control<V, unknown, T>;
  readonly name: N;
  readonly label: ReactNode;
  readonly choices: readonly Choice[];
}

/** A question with its few possible answers side by side; one of them, or none yet. */
export function AnswerField<V extends FieldValues, N extends FieldPath<V>, T extends FieldValues = V>({
  control,
  name,
  label,
  choices,
}: AnswerFieldProps<V, N, T>) {
  const { field, fieldState } = useController({ control, name });
  const styles = useSlotRecipe({ recipe: fieldRecipe })({ invalid: fieldState.error !== undefined });
  const id = useId();
  return (
    <chakra.fieldset border="none" minWidth="0" aria-describedby={fieldState.error ? `${id}-error` : undefined}>
      <chakra.legend textStyle="small">{label}</chakra.legend>
      <chakra.div display="flex" flexWrap="wrap" gap="0 20px" marginTop="2px">
        {choices.map(({ value, label: word }, i) => (
          <chakra.label
            key={value}
            display="inline-flex"
            gap="6px"
            alignItems="center"
            minHeight={{ base: '36px', md: '28px' }}
            textStyle="small"
            cursor="pointer"
          >
            <chakra.input
              type="radio"
              name={id}
              value={value}
              checked={field.value === value}
              onChange={() => field.onChange(value)}
              onBlur={field.onBlur}
              {...(i === 0 ? { ref: field.ref } : {})}
              accentColor="accent"
              width="15px"
              height="15px"
            />
            {word}
          </chakra.label>
        ))}
      </chakra.div>
      {fieldState.error?.message !== undefined && (
        <chakra.p css={styles.error} id={`${id}-error`} role="alert">
          {fieldState.error.message}
        </chakra.p>
      )}
    </chakra.fieldset>
  );
}
