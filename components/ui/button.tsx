import type { ButtonHTMLAttributes } from 'react';
import { buttonClass, type ButtonLook } from './button-class';

type Native = Omit<ButtonHTMLAttributes<HTMLButtonElement>, 'disabled' | 'onClick'>;

/**
 * The platform's own button: React Aria's would take a third of what the list's opening script
 * may weigh beside the framework.
 */
export function Button({
  look = 'plain',
  className = '',
  isDisabled = false,
  onPress,
  type = 'button',
  ...props
}: Native & { look?: ButtonLook; isDisabled?: boolean; onPress?: () => void }) {
  return (
    <button
      {...props}
      type={type}
      disabled={isDisabled}
      onClick={onPress && (() => onPress())}
      className={`${buttonClass(look)} ${className}`}
    />
  );
}
