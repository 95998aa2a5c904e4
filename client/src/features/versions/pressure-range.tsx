import { chakra } from '@chakra-ui/react';
import { useWatch, type UseFormReturn } from 'react-hook-form';
import { fill } from '../../lib/fill';
import { useReaderUnits } from '../../lib/units';
import { versionStrings } from '../../strings/versions';
import { WordButton } from '../../ui/form/button';
import { AreaField, NumberField } from '../../ui/form/field';
import { rangeText } from '../../ui/numbers/quantity';
import { MarginBlock } from '../../ui/page/margin-block';
import { type VersionFields } from './version-words';

const words = versionStrings.edit;

interface PressureRangeProps {
  readonly form: UseFormReturn<VersionFields>;
  /** Of the fit, Pa. */
  readonly fitted: { readonly pressureMinimum: number; readonly pressureMaximum: number };
}

/** The one thing of the range that an editor may state: how far it reaches in P, and why. */
export function PressureRange({ form, fitted }: PressureRangeProps) {
  const units = useReaderUnits();
  const { control, setValue } = form;
  const states = useWatch({ control, name: 'range.states' });
  const range = rangeText('pressure', fitted.pressureMinimum, fitted.pressureMaximum, units.pressure, 5);
  return (
    <MarginBlock title={words.range}>
      <p>{fill(words.rangeHint, { range })}</p>
      <p>
        <WordButton
          aria-expanded={states}
          onClick={() => setValue('range.states', !states, { shouldDirty: true, shouldValidate: true })}
        >
          {states ? words.fitRange : words.ownRange}
        </WordButton>
      </p>
      {states && (
        <chakra.div display="grid" gap="8px" marginTop="8px">
          <chakra.div display="grid" gridTemplateColumns="1fr 1fr" gap="16px">
            <NumberField control={control} name="range.minimum" label={words.minimum} unit="kPa" size="small" />
            <NumberField control={control} name="range.maximum" label={words.maximum} unit="kPa" size="small" />
          </chakra.div>
          <AreaField control={control} name="range.reason" label={words.reason} rows={3} />
        </chakra.div>
      )}
    </MarginBlock>
  );
}
