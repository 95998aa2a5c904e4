import { render, screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { WithProviders } from '../test/with-providers';
import { StateMark, stateOf } from './state-mark';

it.each([
  'draft',
  'submitted',
  'in review',
  'returned',
  'approved',
  'accepted',
  'released',
  'superseded',
  'withdrawn',
  'retired',
] as const)('says %s in words beside its mark', (state) => {
  const { container } = render(
    <WithProviders>
      <StateMark state={state} />
    </WithProviders>,
  );
  expect(screen.getByText(state)).toBeVisible();
  expect(container.querySelector('svg')).toHaveAttribute('aria-hidden', 'true');
});

it('turns the tube of a withdrawn version upside down', () => {
  const { container } = render(
    <WithProviders>
      <StateMark state="withdrawn" />
    </WithProviders>,
  );
  expect(container.querySelector('g')).toHaveAttribute('transform', 'rotate(180 6.5 7.5)');
});

it('takes the states of the API by their names', () => {
  expect(stateOf('IN_REVIEW')).toBe('in review');
  expect(stateOf('RELEASED')).toBe('released');
});
