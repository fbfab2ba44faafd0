import { useId, useState } from 'react';
import { Button } from '@/components/ui/button';
import { fileSize } from '@/components/design/file-link';

/** As lib/schemas/order.ts has them; the server counts again. */
interface Limits {
  readonly bytes: number;
  readonly files: number;
}

/** What a browser offers to choose; a phone offers its camera. */
const OFFERED = 'image/png,image/jpeg,image/webp,application/pdf,.dxf,.csv,.txt';

/** Photos and files to send along. */
export function FileChoice({
  files,
  limits,
  onChange,
}: {
  files: readonly File[];
  limits: Limits;
  onChange: (files: File[]) => void;
}) {
  const id = useId();
  const [refused, setRefused] = useState<string | null>(null);

  function add(given: readonly File[]) {
    const large = given.find(({ size }) => size > limits.bytes);
    const fitting = given.filter((file) => file !== large && file.size <= limits.bytes);
    const all = [...files, ...fitting];
    onChange(all.slice(0, limits.files));
    if (large) {
      setRefused(`${large.name}: ${fileSize(large.size)}; at most ${limits.bytes / 1e6} MB.`);
    } else if (all.length > limits.files) {
      setRefused(`At most ${limits.files} files with one message; the rest was left out.`);
    } else setRefused(null);
  }

  return (
    <div className="flex flex-col gap-1">
      <label htmlFor={id} className="font-medium">
        Photos and files
      </label>
      <input
        id={id}
        type="file"
        multiple
        accept={OFFERED}
        aria-describedby={`${id}-taken`}
        className="min-h-11 w-full py-1 file:mr-3 file:min-h-9 file:rounded-[3px] file:border file:border-solid file:border-edge file:bg-panel file:px-3.5 file:font-semibold max-bench:file:min-h-11"
        onChange={(event) => {
          add([...(event.target.files ?? [])]);
          // So that the same can be chosen again after it was taken off the list.
          event.target.value = '';
        }}
      />
      <p id={`${id}-taken`} className="text-small text-ink-2">
        PNG, JPEG, WebP, PDF, DXF, CSV or plain text; {limits.bytes / 1e6} MB each, at most{' '}
        {limits.files}.
      </p>
      {refused && (
        <p role="alert" className="text-small text-bad">
          {refused}
        </p>
      )}
      {files.length > 0 && (
        <ul aria-label="To send along" className="flex flex-col">
          {files.map((file, index) => (
            <li key={`${file.name} ${index}`} className="flex items-center gap-2">
              <span className="min-w-0 grow wrap-anywhere">{file.name}</span>
              <span className="whitespace-nowrap text-ink-2">{fileSize(file.size)}</span>
              <Button
                look="quiet"
                aria-label={`Leave out ${file.name}`}
                onPress={() => onChange(files.filter((_, at) => at !== index))}
              >
                Leave out
              </Button>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
