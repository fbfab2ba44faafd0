'use client';

import {
  FieldError,
  Input,
  Label,
  Text,
  TextField as AriaTextField,
  type TextFieldProps,
} from 'react-aria-components/TextField';

export const inputClass =
  'w-full min-h-9 rounded-[3px] border border-edge bg-white px-2.5 py-1.5 text-body text-ink outline-offset-1 max-bench:min-h-11 invalid:border-bad data-invalid:border-bad';

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
