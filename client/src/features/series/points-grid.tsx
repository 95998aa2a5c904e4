import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useController, useFieldArray, type Control, type UseFormReturn } from 'react-hook-form';
import { fill } from '../../lib/fill';
import { type ReaderUnits, unitLabel } from '../../lib/units';
import { seriesStrings } from '../../strings/series';
import { WordButton } from '../../ui/form/button';
import { FormError } from '../../ui/form/field';
import { Unit } from '../../ui/numbers/num';
import { fieldRecipe } from '../../ui/recipes/control.recipe';
import { tableRecipe } from '../../ui/recipes/table.recipe';
import { emptyPoint, type SeriesFields } from './series-form';

const words = seriesStrings.edit;
const QUANTITIES = ['temperature', 'pressure', 'diffusivity', 'uncertainty'] as const;
type Column = (typeof QUANTITIES)[number];

const unitOf = (column: Column, units: ReaderUnits): string => {
  const quantity = column === 'uncertainty' ? 'diffusivity' : column;
  return unitLabel(quantity, units[quantity]);
};

/** The points, one a row, to be typed over. */
export function PointsGrid({
  form,
  units,
}: {
  readonly form: UseFormReturn<SeriesFields>;
  readonly units: ReaderUnits;
}) {
  const styles = useSlotRecipe({ recipe: tableRecipe })();
  const { fields, append, remove } = useFieldArray({ control: form.control, name: 'points', keyName: 'key' });
  return (
    <>
      <chakra.div css={styles.scroll} maxWidth="760px">
        <chakra.table css={styles.root}>
          <caption>{words.points}</caption>
          <thead>
            <tr>
              <th scope="col" className="n">
                {seriesStrings.table.number}
              </th>
              {QUANTITIES.map((column) => (
                <th scope="col" className="n" key={column}>
                  <Heading column={column} />
                  <chakra.span css={styles.unit}>
                    <Unit>{unitOf(column, units)}</Unit>
                  </chakra.span>
                </th>
              ))}
              <th scope="col" />
            </tr>
          </thead>
          <tbody>
            {fields.map((field, index) => (
              <tr key={field.key}>
                <td className="n">{index + 1}</td>
                {QUANTITIES.map((column) => (
                  <td key={column} className="n">
                    <Cell control={form.control} index={index} column={column} />
                  </td>
                ))}
                <td>
                  <WordButton
                    quiet
                    aria-label={fill(words.remove, { number: index + 1 })}
                    onClick={() => remove(index)}
                  >
                    {words.removeWord}
                  </WordButton>
                </td>
              </tr>
            ))}
          </tbody>
        </chakra.table>
      </chakra.div>
      <FormError message={form.formState.errors.points?.root?.message ?? form.formState.errors.points?.message} />
      <chakra.p textStyle="caption" color="ink2" marginTop="8px">
        <WordButton onClick={() => append(emptyPoint, { focusName: `points.${fields.length}.temperature` })}>
          {words.add}
        </WordButton>{' '}
        {words.uncertaintyHint}
      </chakra.p>
    </>
  );
}

const Heading = ({ column }: { readonly column: Column }) =>
  column === 'uncertainty' ? (
    <>
      <i>u</i>(<i>D</i>)
    </>
  ) : (
    <i>{words[column]}</i>
  );

function Cell({
  control,
  index,
  column,
}: {
  readonly control: Control<SeriesFields>;
  readonly index: number;
  readonly column: Column;
}) {
  const { field, fieldState } = useController({ control, name: `points.${index}.${column}` });
  const styles = useSlotRecipe({ recipe: fieldRecipe })({ size: 'small', invalid: fieldState.error !== undefined });
  return (
    <chakra.span display="block" minWidth="92px">
      <chakra.span css={styles.frame}>
        <chakra.input
          {...field}
          css={styles.control}
          textAlign="right"
          inputMode="decimal"
          autoComplete="off"
          aria-label={fill(words.cell, { quantity: words[column], number: index + 1 })}
          aria-invalid={fieldState.error !== undefined || undefined}
          fontFeatureSettings='"tnum"'
        />
      </chakra.span>
      {fieldState.error?.message !== undefined && (
        <chakra.span display="block" color="warn" fontSize="12.5px" lineHeight="16px" role="alert" whiteSpace="normal">
          {fieldState.error.message}
        </chakra.span>
      )}
    </chakra.span>
  );
}
