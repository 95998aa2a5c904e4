import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useId, useState, type KeyboardEvent } from 'react';
import {
  diffusivityUnits,
  pressureUnits,
  readerUnits,
  temperatureUnits,
  unitLabel,
  useReaderUnits,
  type Quantity,
  type ReaderUnits,
} from '../lib/units';
import { appStrings } from '../strings/app';
import { Unit } from '../ui/numbers/num';
import { fieldRecipe } from '../ui/recipes/control.recipe';
import { mastheadRecipe } from '../ui/recipes/page.recipe';

const words = appStrings.units;
const TABLES = { temperature: temperatureUnits, pressure: pressureUnits, diffusivity: diffusivityUnits } as const;

/** The reader's units: shown in the masthead, chosen in a small panel under it, remembered. */
export function UnitsMenu() {
  const styles = useSlotRecipe({ recipe: mastheadRecipe })();
  const units = useReaderUnits();
  const [open, setOpen] = useState(false);
  const panel = useId();
  const labels = (Object.keys(TABLES) as Quantity[]).map((quantity) => unitLabel(quantity, units[quantity]));
  const closeOnEscape = (event: KeyboardEvent) => event.key === 'Escape' && setOpen(false);
  return (
    <chakra.div
      onKeyDown={closeOnEscape}
      onBlur={(event) => {
        if (event.relatedTarget instanceof Node && !event.currentTarget.contains(event.relatedTarget)) setOpen(false);
      }}
    >
      <chakra.button
        type="button"
        css={styles.preference}
        aria-expanded={open}
        aria-controls={panel}
        aria-label={`${words.menu}: ${labels.join(', ')}`}
        onClick={() => setOpen(!open)}
      >
        {labels.slice(0, -1).join(', ')}, <Unit>{labels.at(-1) ?? ''}</Unit>
      </chakra.button>
      <chakra.div css={styles.panel} id={panel} hidden={!open}>
        {(Object.keys(TABLES) as Quantity[]).map((quantity) => (
          <UnitChoice key={quantity} quantity={quantity} units={units} />
        ))}
        <chakra.p textStyle="caption" color="ink2">
          {words.note}
        </chakra.p>
      </chakra.div>
    </chakra.div>
  );
}

function UnitChoice({ quantity, units }: { readonly quantity: Quantity; readonly units: ReaderUnits }) {
  const field = useSlotRecipe({ recipe: fieldRecipe })();
  const id = useId();
  return (
    <div>
      <chakra.label css={field.label} htmlFor={id}>
        {words[quantity]}
      </chakra.label>
      <chakra.div css={field.frame}>
        <chakra.select
          id={id}
          css={field.select}
          value={units[quantity]}
          onChange={(event) => readerUnits.set({ ...units, [quantity]: event.target.value })}
        >
          {Object.entries(TABLES[quantity]).map(([unit, { label }]) => (
            <option key={unit} value={unit}>
              {label}
            </option>
          ))}
        </chakra.select>
      </chakra.div>
    </div>
  );
}
