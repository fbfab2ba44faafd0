import { useId } from 'react';
import { inputClass } from './input-class';

/** The platform's own select: quick with a glove, a keyboard and a reader alike. */
export function SelectField<V extends string>({
  label,
  value,
  options,
  onChange,
  className = '',
}: {
  label: string;
  value: V;
  options: readonly { readonly value: V; readonly label: string }[];
  onChange: (value: V) => void;
  className?: string;
}) {
  const id = useId();
  return (
    <div className={`flex flex-col gap-1 ${className}`}>
      <label htmlFor={id} className="font-medium">
        {label}
      </label>
      <select
        id={id}
        value={value}
        onChange={(event) => onChange(event.target.value as V)}
        className={inputClass}
      >
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </div>
  );
}
