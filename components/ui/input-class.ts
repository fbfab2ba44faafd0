export const inputClass =
  'w-full min-h-9 rounded-[3px] border border-edge bg-white px-2.5 py-1.5 text-body text-ink outline-offset-1 max-bench:min-h-11 data-invalid:border-2 data-invalid:border-bad';
