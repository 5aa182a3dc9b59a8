/** A short rod whose brass runs along while work is under way. */
export const RodProgress = ({ label }: { label: string }) => (
  <span
    role="progressbar"
    aria-label={label}
    className="relative inline-block h-3 w-28 overflow-hidden border-b border-brass"
  >
    <span className="rod-marks absolute inset-0" />
    <span className="rod-running absolute inset-y-0 left-0 w-1/3 bg-brass" />
  </span>
);
