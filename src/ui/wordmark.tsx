/** The rod and the name; where room is short on a phone, the rod alone. */
export const Wordmark = ({ compact = false }: { compact?: boolean }) => (
  <span className="flex items-center gap-2">
    <svg viewBox="0 0 44 12" className="h-3 w-11" aria-hidden="true">
      <path
        d="M1 10.5H43M1.500 11V2M7.400 11V6M13.200 11V6M19 11V6M24.900 11V2M30.700 11V6M36.600 11V6M42.500 11V2"
        className="fill-none stroke-brass"
        strokeWidth={1.2}
      />
    </svg>
    <span className={`font-semibold tracking-[0.14em] ${compact ? 'max-sm:hidden' : ''}`}>
      ELLWAND
    </span>
  </span>
);
