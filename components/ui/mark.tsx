/** The product's sign: a blade turning into a stator. Decorative; the name stands beside it. */
export function Mark({ size = 26 }: { size?: number }) {
  return (
    <svg
      width={size}
      height={(size * 20) / 32}
      viewBox="0 0 32 20"
      aria-hidden="true"
      className="shrink-0"
    >
      <path
        d="M1.5 18.500a14.5 14.5 0 0 1 29 0z"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.8"
      />
      <path d="M16 18.5 5.2 10.600C8.6 3.4 17.4 1.8 23.8 7.600z" className="fill-action" />
    </svg>
  );
}
