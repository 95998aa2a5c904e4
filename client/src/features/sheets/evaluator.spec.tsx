import { ApolloLink } from '@apollo/client';
import { ApolloProvider } from '@apollo/client/react';
import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { of, type Observable } from 'rxjs';
import { afterEach, describe, expect, it } from 'vitest';
import { createApolloClient } from '../../lib/apollo';
import { defaultUnits, readerUnits } from '../../lib/units';
import { WithProviders } from '../../ui/test/with-providers';
import { Evaluator } from './evaluator';

interface Asked {
  readonly temperature: readonly number[];
  readonly pressure: readonly number[];
  readonly kind: string;
}

const RANGE = { temperatureMinimum: 283.15, temperatureMaximum: 448.15, pressureMinimum: 1e3, pressureMaximum: 4e5 };

/** Answers every evaluation with the same invented value, marked outside beyond the range in T, and notes what was asked. */
function show(answer: 'value' | 'refusal' = 'value') {
  const asked: Asked[] = [];
  const link = new ApolloLink((operation): Observable<ApolloLink.Result> => {
    const variables = operation.variables as Asked;
    asked.push(variables);
    if (answer === 'refusal')
      return of({
        errors: [{ message: 'The temperature is below absolute zero.', extensions: { code: 'BAD_USER_INPUT' } }],
      });
    const [temperature = 0] = variables.temperature;
    const outside = temperature < RANGE.temperatureMinimum || temperature > RANGE.temperatureMaximum ? [0] : [];
    const evaluate = {
      __typename: 'Evaluation',
      diffusivities: [1.35972e-5],
      standardUncertainties: [5.04e-8],
      expandedUncertainties: [variables.kind === 'MEAN' ? 1.296e-7 : 2.8e-7],
      coverageFactor: 2.5706,
      outside,
    };
    const correlation = { __typename: 'Correlation', evaluate };
    return of({
      data: {
        dataSheet: {
          __typename: 'DataSheet',
          id: '1',
          version: { __typename: 'DataSheetVersion', id: '2', correlation },
        },
      },
    });
  });
  render(
    <ApolloProvider client={createApolloClient(link)}>
      <WithProviders>
        <Evaluator
          target={{ code: 'DS-0001', number: '2.0' }}
          range={RANGE}
          start={{ temperature: 298.15, pressure: 101_325 }}
          predicts
        />
      </WithProviders>
    </ApolloProvider>,
  );
  return { user: userEvent.setup(), asked };
}

describe('the evaluator', () => {
  afterEach(() => readerUnits.set(defaultUnits));

  it('asks the service at the reference state and prints D with u, U, k and the interval for one new laboratory', async () => {
    const { asked } = show();
    expect(await screen.findByText('0.13597(50)')).toBeVisible();
    expect(screen.getByText(/within range/)).toBeVisible();
    expect(screen.getByText(/= 2\.57/)).toHaveTextContent(/U = 0\.0013 cm2\/s, k = 2\.57/);
    expect(screen.getByText(/one new laboratory/)).toHaveTextContent('±0.0028 cm2/s');
    expect(asked.map(({ temperature, pressure, kind }) => [temperature[0], pressure[0], kind])).toEqual(
      expect.arrayContaining([
        [298.15, 101_325, 'MEAN'],
        [298.15, 101_325, 'NEW_SERIES'],
      ]),
    );
  });

  it('sends what was typed in SI, once typing has stopped', async () => {
    const { user, asked } = show();
    await screen.findByText('0.13597(50)');
    await user.selectOptions(screen.getByLabelText('Unit of temperature'), 'degC');
    expect(screen.getByLabelText('Temperature')).toHaveValue('25');
    const before = asked.length;
    await user.clear(screen.getByLabelText('Temperature'));
    await user.type(screen.getByLabelText('Temperature'), '40,0');
    await waitFor(() => expect(asked.at(-1)?.temperature[0]).toBe(313.15));
    // One state, asked for its mean and its prediction; not one for each key.
    expect(asked.length - before).toBeLessThanOrEqual(2);
  });

  it('says so when the state lies outside the range, and keeps the value with its unit and uncertainty', async () => {
    const { user } = show();
    await screen.findByText('0.13597(50)');
    await user.clear(screen.getByLabelText('Temperature'));
    await user.type(screen.getByLabelText('Temperature'), '480');
    expect(await screen.findByText('Outside the range')).toBeVisible();
    expect(screen.getByText(/283\.15 K to 448\.15 K, 1 kPa to 400 kPa\./)).toBeVisible();
    expect(screen.getByText('0.13597(50)')).toBeVisible();
  });

  it('shows no value for a temperature that cannot be', async () => {
    const { user } = show();
    await screen.findByText('0.13597(50)');
    await user.clear(screen.getByLabelText('Temperature'));
    await user.type(screen.getByLabelText('Temperature'), '-3');
    expect(screen.getByRole('alert')).toHaveTextContent('Enter a temperature above absolute zero.');
    expect(screen.queryByText('0.13597(50)')).not.toBeInTheDocument();
    expect(screen.getByLabelText('Temperature')).toHaveAttribute('aria-invalid', 'true');
  });

  it('moves by 1 K and 10 K with the arrow keys on its rule', async () => {
    const { user } = show();
    screen.getByRole('slider').focus();
    await user.keyboard('{ArrowRight}{Shift>}{ArrowRight}{/Shift}');
    expect(screen.getByLabelText('Temperature')).toHaveValue('309.15');
  });

  it('says in the service’s words why there is no answer', async () => {
    show('refusal');
    expect(await screen.findByText(/The temperature is below absolute zero\./)).toBeVisible();
  });
});
