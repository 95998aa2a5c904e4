import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useId, useState } from 'react';
import { fill } from '../../lib/fill';
import { parseNumber } from '../../lib/parse-number';
import { bringInStrings } from '../../strings/bring-in';
import { Typeset } from '../../ui/numbers/typeset';
import { fieldRecipe } from '../../ui/recipes/control.recipe';
import { PRESSURE_ORIGINS, type ColumnRole, type TableMapping } from './answer';
import { Meaning } from './column-head';
import { HeadSelect } from './head-select';
import { unitsOffered } from './units-offered';

const words = bringInStrings.constants;

interface ConstantsProps {
  readonly mapping: TableMapping;
  readonly onMapping: (mapping: TableMapping) => void;
}

/** What holds for every row because no column says it, and what the pressure is. */
export function Constants({ mapping, onMapping }: ConstantsProps) {
  const has = (role: ColumnRole) => mapping.columns.some((column) => column.role === role);
  const { diffusivityUncertainty: u } = mapping;
  return (
    <chakra.div marginTop="22px">
      <chakra.h3 textStyle="subsection">{words.title}</chakra.h3>
      <chakra.p textStyle="caption" color="ink2">
        {words.note}
      </chakra.p>
      <chakra.div display="flex" flexWrap="wrap" gap="12px 32px" marginTop="10px" alignItems="flex-end">
        {!has('TEMPERATURE') && (
          <Constant
            name={words.temperature}
            role="TEMPERATURE"
            stated={mapping.temperature}
            onStated={(temperature) => onMapping({ ...mapping, temperature })}
          />
        )}
        {!has('PRESSURE') && (
          <Constant
            name={words.pressure}
            role="PRESSURE"
            stated={mapping.pressure}
            onStated={(pressure) => onMapping({ ...mapping, pressure })}
          />
        )}
        {!has('DIFFUSIVITY_UNCERTAINTY') && (
          <>
            <Constant
              name={words.uncertainty}
              role="DIFFUSIVITY_UNCERTAINTY"
              stated={u}
              onStated={(stated) =>
                onMapping({
                  ...mapping,
                  diffusivityUncertainty: stated && {
                    ...stated,
                    reading: u?.reading ?? { kind: 'STANDARD', coverageFactor: 1, scope: 'INDEPENDENT' },
                  },
                })
              }
            />
            {u !== null && (
              <div>
                <Meaning
                  name={plain(words.uncertainty)}
                  reading={u.reading}
                  mayBeCommon
                  onChange={(reading) => onMapping({ ...mapping, diffusivityUncertainty: { ...u, reading } })}
                />
              </div>
            )}
          </>
        )}
        <chakra.div>
          <chakra.span display="block" fontSize="13px" lineHeight="18px" color="ink2" aria-hidden>
            {words.pressureOrigin}
          </chakra.span>
          <HeadSelect
            label={words.pressureOrigin}
            value={mapping.pressureOrigin}
            choices={PRESSURE_ORIGINS.map((origin) => [origin, bringInStrings.pressureOrigins[origin]] as const)}
            onChange={(pressureOrigin) => onMapping({ ...mapping, pressureOrigin })}
          />
        </chakra.div>
      </chakra.div>
    </chakra.div>
  );
}

interface Stated {
  readonly value: number;
  readonly unit: string;
}

interface ConstantProps {
  readonly name: string;
  readonly role: ColumnRole;
  readonly stated: Stated | null;
  readonly onStated: (stated: Stated | null) => void;
}

const plain = (typeset: string): string => typeset.replaceAll('*', '');

/** A number with its unit; empty is not stated. */
function Constant({ name, role, stated, onStated }: ConstantProps) {
  const [text, setText] = useState(stated === null ? '' : String(stated.value));
  const units = unitsOffered(role);
  const [unit, setUnit] = useState(stated?.unit ?? units[0] ?? '');
  const isNumber = text.trim() === '' || parseNumber(text) !== null;
  const styles = useSlotRecipe({ recipe: fieldRecipe })({ size: 'small', invalid: !isNumber });
  const id = useId();
  const change = (nextText: string, nextUnit: string) => {
    setText(nextText);
    setUnit(nextUnit);
    const value = parseNumber(nextText);
    if (nextText.trim() === '') onStated(null);
    else if (value !== null) onStated({ value, unit: nextUnit });
  };
  return (
    <chakra.div css={styles.root}>
      <chakra.label css={styles.label} htmlFor={id}>
        <Typeset>{name}</Typeset>
      </chakra.label>
      <chakra.div css={styles.frame}>
        <chakra.input
          css={styles.control}
          id={id}
          width="90px"
          inputMode="decimal"
          autoComplete="off"
          value={text}
          aria-invalid={!isNumber || undefined}
          onChange={(event) => change(event.target.value, unit)}
        />
        <HeadSelect
          label={fill(words.unitOf, { name: plain(name) })}
          value={unit}
          choices={units.map((one) => [one, one] as const)}
          onChange={(next) => change(text, next)}
        />
      </chakra.div>
      {!isNumber && <chakra.p css={styles.error}>{words.notANumber}</chakra.p>}
    </chakra.div>
  );
}
