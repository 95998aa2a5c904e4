import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useId, useState, type HTMLInputAutoCompleteAttribute, type ReactNode } from 'react';
import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';
import { WarnMark } from '../marks/marks';
import { fieldRecipe } from '../recipes/control.recipe';
import { WordButton } from './button';

interface FrameProps {
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
  readonly size?: 'normal' | 'small';
  readonly width?: string;
  /** In a wide margin the label stands at the left of its control. */
  readonly beside?: boolean;
}

interface FieldProps<V extends FieldValues, N extends FieldPath<V>, T extends FieldValues = V> extends FrameProps {
  readonly control: Control<V, unknown, T>;
  readonly name: N;
  readonly placeholder?: string;
}

/** What ties a control to its label, hint and error. */
function useFieldParts({ hint, error, size = 'normal' }: FrameProps) {
  const id = useId();
  const styles = useSlotRecipe({ recipe: fieldRecipe })({ size, invalid: error !== undefined });
  const described = [error === undefined ? null : `${id}-error`, hint === undefined ? null : `${id}-hint`]
    .filter((part) => part !== null)
    .join(' ');
  const control = {
    id,
    ...(described === '' ? {} : { 'aria-describedby': described }),
    ...(error === undefined ? {} : { 'aria-invalid': true }),
  };
  return { id, styles, control };
}

type Parts = ReturnType<typeof useFieldParts>;

const BESIDE = {
  display: { lg: 'grid' },
  gridTemplateColumns: { lg: '88px minmax(0, 1fr)' },
  columnGap: '8px',
  alignItems: 'baseline',
  '& > p': { gridColumn: { lg: 2 } },
};

function Frame({
  parts,
  label,
  hint,
  error,
  width,
  beside = false,
  children,
}: FrameProps & { readonly parts: Parts; readonly children: ReactNode }) {
  const { id, styles } = parts;
  return (
    <chakra.div
      css={beside ? [styles.root, BESIDE] : styles.root}
      maxWidth="100%"
      {...(width === undefined ? {} : { width })}
    >
      <chakra.label css={styles.label} htmlFor={id}>
        {label}
      </chakra.label>
      {children}
      {error !== undefined && (
        <chakra.p css={styles.error} id={`${id}-error`} role="alert">
          <WarnMark />
          {error}
        </chakra.p>
      )}
      {hint !== undefined && (
        <chakra.p css={styles.hint} id={`${id}-hint`}>
          {hint}
        </chakra.p>
      )}
    </chakra.div>
  );
}

interface TextFieldProps<V extends FieldValues, N extends FieldPath<V>, T extends FieldValues = V> extends FieldProps<
  V,
  N,
  T
> {
  readonly type?: 'text' | 'email' | 'search' | 'url';
  readonly autoComplete?: HTMLInputAutoCompleteAttribute;
  /** Stands inside the underline, after the value. */
  readonly unit?: ReactNode;
  readonly inputMode?: 'text' | 'decimal' | 'numeric' | 'email';
}

/** One line of text, or a number with its unit. */
export function TextField<V extends FieldValues, N extends FieldPath<V>, T extends FieldValues = V>(
  props: TextFieldProps<V, N, T>,
) {
  const { control, name, type = 'text', autoComplete, unit, inputMode, placeholder } = props;
  const { field, fieldState } = useController({ control, name });
  const error = props.error ?? fieldState.error?.message;
  const parts = useFieldParts({ ...props, error });
  return (
    <Frame {...props} error={error} parts={parts}>
      <chakra.div css={parts.styles.frame}>
        <chakra.input
          {...parts.control}
          {...field}
          css={parts.styles.control}
          type={type}
          autoComplete={autoComplete}
          inputMode={inputMode}
          placeholder={placeholder}
        />
        {unit !== undefined && <chakra.span css={parts.styles.inside}>{unit}</chakra.span>}
      </chakra.div>
    </Frame>
  );
}

/** A number typed as text: decimal keyboard, tabular figures. */
export const NumberField = <V extends FieldValues, N extends FieldPath<V>, T extends FieldValues = V>(
  props: TextFieldProps<V, N, T>,
) => <TextField inputMode="decimal" {...props} />;

interface PasswordFieldProps<
  V extends FieldValues,
  N extends FieldPath<V>,
  T extends FieldValues = V,
> extends FieldProps<V, N, T> {
  readonly autoComplete: 'current-password' | 'new-password';
}

/** A password, hidden until shown. */
export function PasswordField<V extends FieldValues, N extends FieldPath<V>, T extends FieldValues = V>(
  props: PasswordFieldProps<V, N, T>,
) {
  const { field, fieldState } = useController({ control: props.control, name: props.name });
  const [shown, setShown] = useState(false);
  const error = props.error ?? fieldState.error?.message;
  const parts = useFieldParts({ ...props, error });
  return (
    <Frame {...props} error={error} parts={parts}>
      <chakra.div css={parts.styles.frame}>
        <chakra.input
          {...parts.control}
          {...field}
          css={parts.styles.control}
          type={shown ? 'text' : 'password'}
          autoComplete={props.autoComplete}
        />
        <chakra.span css={parts.styles.inside}>
          <WordButton
            aria-pressed={shown}
            aria-label={shown ? 'hide the password' : 'show the password'}
            onClick={() => setShown(!shown)}
          >
            {shown ? 'hide' : 'show'}
          </WordButton>
        </chakra.span>
      </chakra.div>
    </Frame>
  );
}

export interface Choice {
  readonly value: string;
  readonly label: string;
}

interface SelectFieldProps<V extends FieldValues, N extends FieldPath<V>, T extends FieldValues = V> extends FieldProps<
  V,
  N,
  T
> {
  readonly choices: readonly Choice[];
}

/** One of a few. */
export function SelectField<V extends FieldValues, N extends FieldPath<V>, T extends FieldValues = V>(
  props: SelectFieldProps<V, N, T>,
) {
  const { field, fieldState } = useController({ control: props.control, name: props.name });
  const error = props.error ?? fieldState.error?.message;
  const parts = useFieldParts({ ...props, error });
  return (
    <Frame {...props} error={error} parts={parts}>
      <chakra.div css={parts.styles.frame}>
        <chakra.select {...parts.control} {...field} css={parts.styles.select}>
          {props.choices.map(({ value, label }) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </chakra.select>
      </chakra.div>
    </Frame>
  );
}

/** Several lines of text: the one field with a box. */
export function AreaField<V extends FieldValues, N extends FieldPath<V>, T extends FieldValues = V>(
  props: FieldProps<V, N, T> & { readonly rows?: number },
) {
  const { field, fieldState } = useController({ control: props.control, name: props.name });
  const error = props.error ?? fieldState.error?.message;
  const parts = useFieldParts({ ...props, error });
  return (
    <Frame {...props} error={error} parts={parts}>
      <chakra.textarea
        {...parts.control}
        {...field}
        css={parts.styles.area}
        rows={props.rows ?? 3}
        placeholder={props.placeholder}
      />
    </Frame>
  );
}

/** What the whole form was refused for. */
export const FormError = ({ message }: { readonly message: string | undefined }) =>
  message === undefined ? null : (
    <chakra.p role="alert" color="warn" textStyle="small">
      <WarnMark />
      {message}
    </chakra.p>
  );

/** Fields under one another, or beside one another from `columns` on. */
export const Fields = ({
  columns = 1,
  children,
}: {
  readonly columns?: 1 | 2 | 3 | 4;
  readonly children: ReactNode;
}) => (
  <chakra.div
    display="grid"
    gap="16px 32px"
    maxWidth={columns === 1 ? '420px' : columns === 2 ? '760px' : 'none'}
    marginTop="18px"
    gridTemplateColumns={{ base: '1fr', md: `repeat(${columns}, minmax(0, 1fr))` }}
  >
    {children}
  </chakra.div>
);
