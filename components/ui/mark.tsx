/** The mark: a pintle in its gudgeon. The pin passes in front of the ring above and behind it below. */
export function Mark({ size = 30 }: { size?: number }) {
  return (
    <svg width={(size * 26) / 30} height={size} viewBox="0 0 26 30" aria-hidden focusable="false" className="flex-none">
      <rect x={10.4} y={0} width={5.2} height={30} rx={2.6} fill="var(--brass)" />
      <circle cx={13} cy={16} r={9} fill="none" stroke="currentColor" strokeWidth={4.2} />
      <rect x={10.4} y={0} width={5.2} height={11} rx={2.6} fill="var(--brass)" />
    </svg>
  );
}
