import { type CorrelationForm, type CorrelationFormName } from './form.js';
import { powerLaw } from './power-law.js';
import { powerLawFreePressure } from './power-law-free-pressure.js';

/** The forms that can be fitted and evaluated. A new form is one file and one entry here. */
const FORMS: readonly CorrelationForm[] = [powerLaw, powerLawFreePressure];

export const availableForms: readonly CorrelationFormName[] = FORMS.map((form) => form.name);

/** The form of that name, or null where the engine does not have it yet. */
export function findForm(name: CorrelationFormName): CorrelationForm | null {
  return FORMS.find((form) => form.name === name) ?? null;
}
