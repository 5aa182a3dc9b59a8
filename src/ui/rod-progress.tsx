type RodProgressProps = {
  readonly label: string;
  /** How much is done, 0 to 1, where that is known. */
  readonly share?: number | undefined;
};

/** A short rod whose brass runs along while work is under way, or as far as the work has come. */
export const RodProgress = ({ label, share }: RodProgressProps) => (
  <span
    role="progressbar"
    aria-label={label}
    aria-valuenow={share === undefined ? undefined : Math.round(share * 100)}
    className="relative inline-block h-3 w-28 shrink-0 overflow-hidden border-b border-brass"
  >
    <span className="rod-marks absolute inset-0" />
    {share === undefined ? (
      <span className="rod-running absolute inset-y-0 left-0 w-1/3 bg-brass" />
    ) : (
      <span className="absolute inset-y-0 left-0 bg-brass" style={{ width: `${share * 100}%` }} />
    )}
  </span>
);
