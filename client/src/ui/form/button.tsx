import { chakra, useRecipe } from '@chakra-ui/react';
import { type ButtonHTMLAttributes, type ReactNode } from 'react';
import { Link, type LinkProps } from 'react-router-dom';
import { buttonRecipe, wordButtonRecipe } from '../recipes/control.recipe';

interface ButtonProps extends Omit<ButtonHTMLAttributes<HTMLButtonElement>, 'disabled' | 'color'> {
  /** One primary button on a screen. */
  readonly kind?: 'plain' | 'primary';
  readonly size?: 'normal' | 'small';
  /** The action is running: the button stays where it is and does not start a second one. */
  readonly busy?: boolean;
  /** Not yet possible, and what is missing: dashed, reachable, explained beside it. */
  readonly waitingFor?: ReactNode;
}

/** Starts an action. */
export function Button({
  kind = 'plain',
  size = 'normal',
  busy = false,
  waitingFor,
  onClick,
  type = 'button',
  ...rest
}: ButtonProps) {
  const waiting = waitingFor !== undefined && waitingFor !== null && waitingFor !== false;
  const css = useRecipe({ recipe: buttonRecipe })({ kind: waiting ? 'waiting' : kind, size });
  const idle = busy || waiting;
  const button = (
    <chakra.button
      {...rest}
      // A waiting or running button of a form must not submit it.
      type={idle ? 'button' : type}
      css={css}
      aria-disabled={idle || undefined}
      aria-busy={busy || undefined}
      onClick={idle ? undefined : onClick}
    />
  );
  if (!waiting) return button;
  return (
    <chakra.span display="inline-flex" flexWrap="wrap" gap="4px 14px" alignItems="center">
      {button}
      <chakra.span textStyle="small" color="ink2">
        {waitingFor}
      </chakra.span>
    </chakra.span>
  );
}

interface ButtonLinkProps extends LinkProps {
  readonly kind?: 'plain' | 'primary';
  readonly size?: 'normal' | 'small';
}

/** Leads to where an action is done, and looks like the action. */
export function ButtonLink({ kind = 'plain', size = 'normal', children, ...link }: ButtonLinkProps) {
  const css = useRecipe({ recipe: buttonRecipe })({ kind, size });
  return (
    <chakra.a asChild css={css}>
      <Link {...link}>{children}</Link>
    </chakra.a>
  );
}

interface WordButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  readonly quiet?: boolean;
}

/** An action that reads as a word of the text. */
export function WordButton({ quiet = false, color: _, ...rest }: WordButtonProps) {
  const css = useRecipe({ recipe: wordButtonRecipe })({ quiet });
  return <chakra.button type="button" {...rest} css={css} />;
}

/** Actions of a form or section, side by side. */
export const Actions = ({ children }: { readonly children: ReactNode }) => (
  <chakra.div display="flex" gap="12px 18px" alignItems="center" flexWrap="wrap" marginTop="16px">
    {children}
  </chakra.div>
);
