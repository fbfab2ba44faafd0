'use client';

import { Button as AriaButton, type ButtonProps } from 'react-aria-components/Button';
import { buttonClass, type ButtonLook } from './button-class';

export function Button({
  look = 'plain',
  className = '',
  ...props
}: Omit<ButtonProps, 'className'> & { look?: ButtonLook; className?: string }) {
  return <AriaButton {...props} className={`${buttonClass(look)} ${className}`} />;
}
