import { useLazyQuery, useQuery } from '@apollo/client/react';
import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useId, useState, type KeyboardEvent } from 'react';
import { useController, type Control } from 'react-hook-form';
import { BringInSubstancesDocument, type BringInSubstancesQuery } from '../../gql/graphql';
import { counted } from '../../lib/counted';
import { useDebounced } from '../../lib/use-debounced';
import { bringInStrings } from '../../strings/bring-in';
import { WarnMark } from '../../ui/marks/marks';
import { Formula } from '../../ui/numbers/typeset';
import { fieldRecipe } from '../../ui/recipes/control.recipe';
import { type HeaderValues } from './draft';
import { type Header } from './header-schema';

const words = bringInStrings.pair;
const TYPING_MS = 200;

type Found = BringInSubstancesQuery['substances']['edges'][number]['node'];

interface SubstanceFieldProps {
  readonly control: Control<HeaderValues, unknown, Header>;
  readonly name: 'first' | 'second';
  readonly label: string;
}

/** A substance by name, formula, synonym or CAS RN: a field with the matches under it, walked by arrow keys. */
export function SubstanceField({ control, name, label }: SubstanceFieldProps) {
  const {
    field: { ref, value, onChange, onBlur },
    fieldState,
  } = useController({ control, name });
  const error = fieldState.error?.message;
  const styles = useSlotRecipe({ recipe: fieldRecipe })({ invalid: error !== undefined });
  const id = useId();
  const [open, setOpen] = useState(false);
  const [active, setActive] = useState(-1);
  const typed = value.name.trim();
  const search = useDebounced(typed, TYPING_MS);
  const {
    data,
    loading,
    error: failed,
  } = useQuery(BringInSubstancesDocument, {
    variables: { search },
    skip: !open || search === '',
  });
  const [look] = useLazyQuery(BringInSubstancesDocument);
  const found = search === typed ? (data?.substances.edges.map(({ node }) => node) ?? []) : [];
  const isListed = open && found.length > 0;

  const choose = (substance: Found) => {
    onChange({ id: substance.id, name: substance.name });
    setOpen(false);
    setActive(-1);
  };
  /** Leaving the field with a whole name in it chooses the substance of that name. */
  const settle = async () => {
    onBlur();
    setOpen(false);
    if (value.id !== '' || typed === '') return;
    const { data: answer } = await look({ variables: { search: typed } });
    const match = answer?.substances.edges.find(({ node }) => isNamed(node, typed));
    if (match) choose(match.node);
  };
  const keys = (event: KeyboardEvent) => {
    if (event.key === 'Escape') return setOpen(false);
    if (event.key === 'Enter' && isListed && found[active]) {
      event.preventDefault();
      return choose(found[active]);
    }
    const by = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
    if (by === 0) return;
    event.preventDefault();
    setOpen(true);
    if (found.length > 0) setActive((active + by + found.length) % found.length);
  };

  return (
    <chakra.div css={styles.root} position="relative">
      <chakra.label css={styles.label} htmlFor={id}>
        {label}
      </chakra.label>
      <chakra.div css={styles.frame}>
        <chakra.input
          id={id}
          ref={ref}
          css={styles.control}
          role="combobox"
          autoComplete="off"
          aria-autocomplete="list"
          aria-expanded={isListed}
          aria-controls={`${id}-list`}
          aria-activedescendant={isListed && active >= 0 ? `${id}-${active}` : undefined}
          aria-describedby={`${id}-hint`}
          aria-invalid={error !== undefined || undefined}
          value={value.name}
          onChange={(event) => {
            onChange({ id: '', name: event.target.value });
            setActive(-1);
            setOpen(true);
          }}
          onKeyDown={keys}
          onBlur={() => void settle()}
        />
      </chakra.div>
      <Matches id={id} found={isListed ? found : []} active={active} onChoose={choose} />
      {error !== undefined && (
        <chakra.p css={styles.error}>
          <WarnMark />
          {error}
        </chakra.p>
      )}
      <chakra.p css={styles.hint} id={`${id}-hint`} role="status">
        {hintOf({
          typed,
          chosen: value.id !== '',
          open,
          loading: loading || search !== typed,
          failed: failed !== undefined,
          count: found.length,
        })}
      </chakra.p>
    </chakra.div>
  );
}

interface HintFacts {
  readonly typed: string;
  readonly chosen: boolean;
  readonly open: boolean;
  readonly loading: boolean;
  readonly failed: boolean;
  readonly count: number;
}

function hintOf({ typed, chosen, open, loading, failed, count }: HintFacts): string {
  if (chosen || typed === '' || !open) return words.hint;
  if (failed) return words.failed;
  return loading ? words.loading : counted(words.found, count);
}

const isNamed = ({ name, formula, casNumber, synonyms }: Found, typed: string): boolean =>
  [name, formula, casNumber ?? '', ...synonyms].some((one) => one.toLowerCase() === typed.toLowerCase());

interface MatchesProps {
  readonly id: string;
  readonly found: readonly Found[];
  readonly active: number;
  readonly onChoose: (substance: Found) => void;
}

const Matches = ({ id, found, active, onChoose }: MatchesProps) => (
  <chakra.ul
    id={`${id}-list`}
    role="listbox"
    aria-label={bringInStrings.pair.hint}
    hidden={found.length === 0}
    css={LIST}
  >
    {found.map((substance, i) => (
      <chakra.li
        key={substance.id}
        id={`${id}-${i}`}
        role="option"
        aria-selected={i === active}
        // Pressing must not take the focus from the field, which would close the list before the click.
        onMouseDown={(event) => event.preventDefault()}
        onClick={() => onChoose(substance)}
      >
        {substance.name}
        <chakra.span color="ink3" fontSize="12.5px" marginLeft="8px">
          <Formula>{substance.formula}</Formula>
          {substance.casNumber !== null && ` ${substance.casNumber}`}
        </chakra.span>
      </chakra.li>
    ))}
  </chakra.ul>
);

const LIST = {
  position: 'absolute',
  zIndex: 3,
  top: '53px',
  left: 0,
  minWidth: '100%',
  width: 'max-content',
  maxWidth: { base: '100%', md: '420px' },
  background: 'paper',
  border: '1px solid',
  borderColor: 'control',
  borderRadius: 'control',
  listStyle: 'none',
  padding: '4px 0',
  '&[hidden]': { display: 'none' },
  '& li': { padding: { base: '7px 12px', md: '3px 12px' }, textStyle: 'small', cursor: 'pointer' },
  '& li:hover': { background: 'sunk' },
  '& li[aria-selected=true]': { background: 'accentTint' },
} as const;
