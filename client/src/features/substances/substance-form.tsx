import { chakra } from '@chakra-ui/react';
import { zodResolver } from '@hookform/resolvers/zod';
import { useFieldArray, useForm, useWatch, type Control, type FieldPath } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { type SubstanceConstantKind, type SubstanceFieldsFragment, type SubstanceInput } from '../../gql/graphql';
import { fill } from '../../lib/fill';
import { applyProblems, type Refusal } from '../../lib/form-problems';
import { unitLabel } from '../../lib/units';
import { substanceStrings } from '../../strings/substances';
import { Actions, Button, WordButton } from '../../ui/form/button';
import { Fields, FormError, NumberField, SelectField, TextField } from '../../ui/form/field';
import { Typeset } from '../../ui/numbers/typeset';
import { Section } from '../../ui/page/section';
import { CONSTANT_NAMES, CONSTANT_UNITS, printedUnit } from './constant-units';
import {
  emptyConstant,
  emptySubstance,
  substanceSchema,
  toFormValues,
  toInput,
  type SubstanceFormValues,
} from './substance-schema';

const words = substanceStrings.form;

interface SubstanceFormProps {
  /** Being edited; absent for a new one. */
  readonly substance?: SubstanceFieldsFragment;
  /** @returns what was refused; nothing when it is saved */
  readonly onSave: (input: SubstanceInput) => Promise<readonly Refusal[]>;
  readonly cancelTo: string;
}

/** Identity and constants of a substance. What was typed stays when a save is refused. */
export function SubstanceForm({ substance, onSave, cancelTo }: SubstanceFormProps) {
  const form = useForm({
    resolver: zodResolver(substanceSchema),
    defaultValues: substance ? toFormValues(substance) : emptySubstance,
  });
  const constants = useFieldArray({ control: form.control, name: 'constants' });
  const submit = form.handleSubmit(async (values) => {
    const refusals = await onSave(toInput(values, substance?.constants));
    applyProblems(form.setError, refusals, fieldOfPath);
  });
  return (
    <form
      onSubmit={submit}
      noValidate
      aria-label={substance ? fill(words.editTitle, { name: substance.name }) : words.newTitle}
    >
      <Section number={1} title={words.identity} id="identity" tight>
        <Fields columns={2}>
          <TextField control={form.control} name="name" label={words.name} />
          <TextField control={form.control} name="formula" label={words.formula} hint={words.formulaHint} />
          <TextField control={form.control} name="casNumber" label={words.cas} hint={words.casHint} />
          <NumberField control={form.control} name="molarMassGrams" label={words.molarMass} unit="g/mol" />
          <TextField control={form.control} name="inchi" label={words.inchi} />
          <TextField control={form.control} name="synonyms" label={words.synonyms} hint={words.synonymsHint} />
        </Fields>
      </Section>
      <Section number={2} title={words.constants} id="constants">
        <chakra.p textStyle="small" color="ink2">
          {words.constantsLead}
        </chakra.p>
        {constants.fields.map((field, index) => (
          <ConstantFields
            key={field.id}
            control={form.control}
            index={index}
            onRemove={() => constants.remove(index)}
          />
        ))}
        <Actions>
          <Button onClick={() => constants.append(emptyConstant())}>{words.addConstant}</Button>
        </Actions>
        <chakra.div marginTop="34px">
          <FormError message={form.formState.errors.root?.message} />
          <Actions>
            <Button type="submit" kind="primary" busy={form.formState.isSubmitting}>
              {words.save}
            </Button>
            <Link to={cancelTo}>{words.cancel}</Link>
          </Actions>
        </chakra.div>
      </Section>
    </form>
  );
}

const KINDS = Object.entries(CONSTANT_NAMES).map(([value, label]) => ({ value, label }));

interface ConstantFieldsProps {
  readonly control: Control<SubstanceFormValues, unknown, ReturnType<typeof substanceSchema.parse>>;
  readonly index: number;
  readonly onRemove: () => void;
}

function ConstantFields({ control, index, onRemove }: ConstantFieldsProps) {
  const kind = useWatch({ control, name: `constants.${index}.kind` }) as SubstanceConstantKind;
  const unit = printedUnit(CONSTANT_UNITS[kind]);
  const kelvin = unitLabel('temperature', 'K');
  return (
    <chakra.fieldset borderTop="1px solid" borderColor="rule" paddingTop="12px" marginTop="16px">
      <Fields columns={4}>
        <SelectField control={control} name={`constants.${index}.kind`} label={words.kind} choices={KINDS} />
        <NumberField
          control={control}
          name={`constants.${index}.value`}
          label={words.value}
          unit={unit === '1' ? undefined : unit}
        />
        <NumberField
          control={control}
          name={`constants.${index}.relativePercent`}
          label={<Typeset>{words.uncertainty}</Typeset>}
          unit="%"
        />
        <TextField control={control} name={`constants.${index}.source`} label={words.source} />
        <NumberField
          control={control}
          name={`constants.${index}.temperatureMinimum`}
          label={words.minimum}
          unit={kelvin}
        />
        <NumberField
          control={control}
          name={`constants.${index}.temperatureMaximum`}
          label={words.maximum}
          unit={kelvin}
        />
      </Fields>
      <WordButton onClick={onRemove}>{words.removeConstant}</WordButton>
    </chakra.fieldset>
  );
}

/** The form's field for a path of the input; `molarMass` is typed in grams. */
function fieldOfPath(path: string): FieldPath<SubstanceFormValues> | null {
  const inner = path.replace(/^input\./, '');
  if (inner === 'molarMass') return 'molarMassGrams';
  const known = ['name', 'formula', 'casNumber', 'inchi', 'synonyms'] as const;
  return known.find((field) => field === inner.split('.')[0]) ?? constantField(inner);
}

function constantField(path: string): FieldPath<SubstanceFormValues> | null {
  const [, index, field] = /^constants\.(\d+)\.(\w+)$/.exec(path) ?? [];
  if (index === undefined) return null;
  const fields = {
    value: 'value',
    source: 'source',
    kind: 'kind',
    relativeUncertainty: 'relativePercent',
    temperatureMinimum: 'temperatureMinimum',
    temperatureMaximum: 'temperatureMaximum',
  } as const;
  const known = fields[field as keyof typeof fields] as (typeof fields)[keyof typeof fields] | undefined;
  return known === undefined ? null : `constants.${Number(index)}.${known}`;
}
