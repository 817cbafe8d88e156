/** Fairlead's mark: the teeth of the degrees lane over the line of the run. */
export function Mark({ height = 20 }: { height?: number }) {
  return (
    <svg viewBox="0 0 26 18" height={height} width={(height * 26) / 18} aria-hidden="true">
      <path
        d="M1.5 11V6.5H6V3H10.5V12H13.5V6.5H18V2H23.5V11M.5 16.4H25.5"
        fill="none"
        stroke="var(--ink)"
        strokeWidth="2.2"
      />
    </svg>
  );
}
