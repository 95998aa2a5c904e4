import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useState } from 'react';
import { fill } from '../../lib/fill';
import { parseNumber } from '../../lib/parse-number';
import { useReaderUnits } from '../../lib/units';
import { bringInStrings } from '../../strings/bring-in';
import { Unit } from '../../ui/numbers/num';
import { sentenceFieldRecipe } from '../../ui/recipes/control.recipe';
import { COLUMN_ROLES, type ColumnMapping, type UncertaintyReading } from './answer';
import { SHOWN } from './cells';
import { HeadSelect } from './head-select';
import { inRole, unitsOffered } from './units-offered';

const words = bringInStrings.understood;
const roles = COLUMN_ROLES.map((role) => [role, bringInStrings.roles[role]] as const);

interface ColumnHeadProps {
  /** As it is called in the table. */
  readonly name: string;
  readonly column: ColumnMapping;
  readonly onChange: (column: ColumnMapping) => void;
}

/** What a column holds, in which unit, and how an uncertainty is meant: each can be corrected. */
export function ColumnHead({ name, column, onChange }: ColumnHeadProps) {
  const { role, unit, uncertainty } = column;
  const units = unitsOffered(role);
  const choices = unit === null || units.includes(unit) ? units : [unit, ...units];
  return (
    <>
      <HeadSelect
        strong
        label={fill(words.quantity, { column: name })}
        value={role}
        choices={roles}
        onChange={(next) => onChange(inRole(column, next))}
      />
      {units.length > 0 && (
        <chakra.span display="flex" gap="6px" alignItems="baseline">
          <HeadSelect
            label={fill(words.unit, { column: name })}
            value={unit ?? ''}
            choices={[
              ...(unit === null ? [['', words.noUnit] as const] : []),
              ...choices.map((one) => [one, one] as const),
            ]}
            onChange={(next) => onChange({ ...column, unit: next === '' ? null : next, unitOrigin: 'CHOSEN' })}
          />
          <Into column={column} />
        </chakra.span>
      )}
      {uncertainty !== null && (
        <Meaning
          name={name}
          reading={uncertainty}
          onChange={(reading) => onChange({ ...column, uncertainty: reading })}
          mayBeCommon={role === 'DIFFUSIVITY_UNCERTAINTY'}
        />
      )}
    </>
  );
}

/** Into which unit the numbers at the right were converted, where it is another. */
function Into({ column: { role, unit } }: { readonly column: ColumnMapping }) {
  const units = useReaderUnits();
  const shown = SHOWN[role]?.unit(units) ?? '';
  if (shown === '' || shown === unit) return null;
  return (
    <chakra.span fontWeight={400} whiteSpace="nowrap" color="ink2">
      <Unit>{fill(words.to, { unit: shown })}</Unit>
    </chakra.span>
  );
}

interface MeaningProps {
  readonly name: string;
  readonly reading: UncertaintyReading;
  readonly onChange: (reading: UncertaintyReading) => void;
  readonly mayBeCommon: boolean;
}

/** Standard or expanded, independent or common. */
export function Meaning({ name, reading, onChange, mayBeCommon }: MeaningProps) {
  return (
    <>
      <chakra.span display="flex" gap="4px" alignItems="baseline">
        <HeadSelect
          label={fill(words.kind, { column: name })}
          value={reading.kind}
          choices={[
            ['STANDARD', bringInStrings.kinds.STANDARD],
            ['EXPANDED', bringInStrings.kinds.EXPANDED],
          ]}
          onChange={(kind) => onChange({ ...reading, kind, coverageFactor: kind === 'EXPANDED' ? 2 : 1 })}
        />
        {reading.kind === 'EXPANDED' && (
          <Factor
            label={fill(words.factor, { column: name })}
            value={reading.coverageFactor}
            onChange={(coverageFactor) => onChange({ ...reading, coverageFactor })}
          />
        )}
      </chakra.span>
      {mayBeCommon && (
        <HeadSelect
          label={fill(words.scope, { column: name })}
          value={reading.scope}
          choices={[
            ['INDEPENDENT', bringInStrings.scopes.INDEPENDENT],
            ['COMMON', bringInStrings.scopes.COMMON],
          ]}
          onChange={(scope) => onChange({ ...reading, scope })}
        />
      )}
    </>
  );
}

interface FactorProps {
  readonly label: string;
  readonly value: number;
  readonly onChange: (value: number) => void;
}

/** The coverage factor; what is no number above zero is kept as typed and not taken. */
function Factor({ label, value, onChange }: FactorProps) {
  const [text, setText] = useState(String(value));
  const typed = parseNumber(text);
  const isTaken = typed !== null && typed > 0;
  const styles = useSlotRecipe({ recipe: sentenceFieldRecipe })({ invalid: !isTaken });
  return (
    <chakra.span css={styles.frame} lineHeight="24px">
      <chakra.input
        css={styles.input}
        width="40px"
        fontSize="13px"
        aria-label={label}
        aria-invalid={!isTaken || undefined}
        inputMode="decimal"
        value={text}
        onChange={(event) => {
          setText(event.target.value);
          const next = parseNumber(event.target.value);
          if (next !== null && next > 0) onChange(next);
        }}
      />
    </chakra.span>
  );
}
