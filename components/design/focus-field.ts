/** The id of a field's input, by its path in the design. */
export const fieldId = (path: string) => `field-${path.replaceAll('.', '-')}`;

/** Takes the person to a field; false when it isn't on the screen. */
export function focusField(path: string): boolean {
  const element = document.getElementById(fieldId(path));
  const target = element?.querySelector<HTMLElement>('input:checked, input, select') ?? element;
  if (!target) return false;
  target.focus();
  element?.scrollIntoView({ block: 'center' });
  return true;
}
