import SemiButton from '@douyinfe/semi-ui/lib/es/button';
import type { ReactNode } from 'react';

export interface ButtonProps {
  children: ReactNode;
  onClick?: () => void;
  /** `primary`: the one thing to do here. `quiet`: a link-like act. `danger`: what cannot be taken back. */
  kind?: 'primary' | 'plain' | 'quiet' | 'danger';
  type?: 'button' | 'submit';
  size?: 'small' | 'default';
  isDisabled?: boolean;
  /** While the act is under way: says so and takes no second click. */
  isBusy?: boolean;
  'aria-label'?: string;
  'aria-expanded'?: boolean;
  'aria-controls'?: string;
}

export function Button({
  kind = 'plain',
  type = 'button',
  isDisabled = false,
  isBusy = false,
  ...rest
}: ButtonProps) {
  return (
    <SemiButton
      {...rest}
      htmlType={type}
      type={kind === 'primary' ? 'primary' : kind === 'danger' ? 'danger' : 'tertiary'}
      theme={kind === 'primary' ? 'solid' : kind === 'quiet' ? 'borderless' : 'light'}
      disabled={isDisabled || isBusy}
      aria-busy={isBusy}
    />
  );
}
