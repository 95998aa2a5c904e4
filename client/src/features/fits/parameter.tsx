import { type CorrelationNumbersFragment } from '../../gql/graphql';
import { formatShort } from '../../lib/format-quantity';
import { type Quantity as QuantityKind } from '../../lib/units';
import { Concise } from '../../ui/numbers/num';
import { Quantity } from '../../ui/numbers/quantity';

type Parameter = CorrelationNumbersFragment['parameters'][number];

const QUANTITY_OF_UNIT: Readonly<Record<string, QuantityKind>> = {
  K: 'temperature',
  Pa: 'pressure',
  'm2/s': 'diffusivity',
};

/** The quantity a parameter is in, or null for a pure number. */
export const quantityOf = ({ unit }: Pick<Parameter, 'unit'>): QuantityKind | null => QUANTITY_OF_UNIT[unit] ?? null;

/** `D0` as *D* with a low 0. */
export function ParameterSymbol({ symbol }: { readonly symbol: string }) {
  const [, letter = symbol, index = ''] = /^(\D+)(\d*)$/.exec(symbol) ?? [];
  return (
    <>
      <i>{letter}</i>
      {index !== '' && <sub>{index}</sub>}
    </>
  );
}

/** Value and u in one, in the reader's unit; what is held fixed says so. */
export function ParameterValue({ parameter }: { readonly parameter: Parameter }) {
  const { value, standardUncertainty, unit } = parameter;
  const quantity = quantityOf(parameter);
  if (quantity !== null) return <Quantity kind={quantity} value={value} uncertainty={standardUncertainty ?? null} />;
  if (standardUncertainty == null) return <>{formatShort(value)}, held</>;
  return <Concise value={value} uncertainty={standardUncertainty} unit={unit} />;
}
