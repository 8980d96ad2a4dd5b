/** A wheel and the start of a belt. */
export function Mark({ size = 32 }: { size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 32 32" fill="none" strokeWidth="2.4" aria-hidden="true">
      <path d="M13 5.4H31" stroke="var(--color-measured)" />
      <circle cx="13" cy="17" r="10.4" stroke="currentColor" />
      <circle cx="13" cy="17" r="3.4" stroke="currentColor" />
    </svg>
  );
}
