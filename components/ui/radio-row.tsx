import { useId, type ReactNode } from 'react';

interface Option {
  readonly value: string;
  readonly content: ReactNode;
}

/** One of a few options, all in sight: the browser's own radio buttons behind their labels. */
export function RadioRow({
  id,
  label,
  labelClass,
  help,
  options,
  value,
  onChange,
  onBlur,
  className,
  rowClass,
  optionClass,
}: {
  id?: string;
  label: string;
  labelClass: string;
  help?: string;
  options: readonly Option[];
  value: string;
  onChange: (value: string) => void;
  onBlur?: () => void;
  className: string;
  rowClass: string;
  optionClass: string;
}) {
  const own = useId();
  return (
    <div
      id={id}
      role="radiogroup"
      aria-labelledby={`${own}-label`}
      aria-describedby={help === undefined ? undefined : `${own}-help`}
      className={className}
    >
      <span id={`${own}-label`} className={labelClass}>
        {label}
      </span>
      {help !== undefined && (
        <span id={`${own}-help`} className="sr-only">
          {help}
        </span>
      )}
      <div className={rowClass}>
        {options.map((option) => (
          // The hidden input needs its label as containing block, or focus scrolls elsewhere.
          <label key={option.value} className={`relative cursor-pointer ${optionClass}`}>
            <input
              type="radio"
              name={own}
              value={option.value}
              checked={option.value === value}
              onChange={() => onChange(option.value)}
              onBlur={onBlur}
              className="sr-only"
            />
            {option.content}
          </label>
        ))}
      </div>
    </div>
  );
}
