'use client';

import {
  FieldError,
  Input,
  Label,
  Text,
  TextField as AriaTextField,
  type TextFieldProps,
} from 'react-aria-components/TextField';
import { inputClass } from './input-class';

/** One line of text with its label above it. */
export function TextField({
  label,
  description,
  errorMessage,
  autoComplete,
  ...props
}: TextFieldProps & {
  label: string;
  description?: string;
  errorMessage?: string | undefined;
}) {
  return (
    <AriaTextField
      {...props}
      autoComplete={autoComplete}
      isInvalid={Boolean(errorMessage)}
      validationBehavior="aria"
      className="flex flex-col gap-1"
    >
      <Label className="font-medium">{label}</Label>
      <Input className={inputClass} />
      {description && (
        <Text slot="description" className="text-small text-ink-2">
          {description}
        </Text>
      )}
      <FieldError className="text-small text-bad">{errorMessage}</FieldError>
    </AriaTextField>
  );
}
