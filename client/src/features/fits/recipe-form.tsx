import { zodResolver } from '@hookform/resolvers/zod';
import { chakra } from '@chakra-ui/react';
import { useEffect, useRef } from 'react';
import { useForm } from 'react-hook-form';
import { fitStrings } from '../../strings/fits';
import { NumberField, SelectField, type Choice as SelectChoice } from '../../ui/form/field';
import { forms, losses, objectives, recipeSchema, seriesEffects, weightings, type Recipe } from './recipe';

const words = fitStrings.recipe;

function choicesOf<T extends string>(values: readonly T[], names: Readonly<Record<T, string>>): SelectChoice[] {
  return values.map((value) => ({ value, label: names[value] }));
}

interface RecipeFormProps {
  readonly recipe: Recipe;
  readonly onChange: (recipe: Recipe) => void;
}

/** Form, objective, weights, loss, between series, reference: every change is a new choice at once. */
export function RecipeForm({ recipe, onChange }: RecipeFormProps) {
  const form = useForm<Recipe>({ values: recipe, resolver: zodResolver(recipeSchema), mode: 'onChange' });
  const tell = useRef(onChange);
  useEffect(() => {
    tell.current = onChange;
  });
  useEffect(
    () => form.subscribe({ formState: { values: true }, callback: ({ values }) => tell.current(values) }),
    [form],
  );
  const shared = { control: form.control, beside: true, size: 'small' } as const;
  return (
    <chakra.form
      noValidate
      aria-label={words.title}
      onSubmit={(event) => event.preventDefault()}
      display="grid"
      gap={{ base: '10px', lg: '3px' }}
    >
      <SelectField {...shared} name="form" label={words.form} choices={choicesOf(forms, words.forms)} />
      <SelectField
        {...shared}
        name="objective"
        label={words.objective}
        choices={choicesOf(objectives, words.objectives)}
      />
      <SelectField
        {...shared}
        name="weighting"
        label={words.weighting}
        choices={choicesOf(weightings, words.weightings)}
      />
      <SelectField {...shared} name="loss" label={words.loss} choices={choicesOf(losses, words.losses)} />
      <SelectField
        {...shared}
        name="seriesEffect"
        label={words.seriesEffect}
        choices={choicesOf(seriesEffects, words.shortEffects)}
      />
      <NumberField
        {...shared}
        name="betweenSeries"
        label={words.betweenSeries}
        unit="%"
        placeholder={words.estimated}
      />
      <NumberField {...shared} name="referenceTemperature" label={words.referenceTemperature} unit="K" />
      <NumberField {...shared} name="referencePressure" label={words.referencePressure} unit="kPa" />
    </chakra.form>
  );
}
