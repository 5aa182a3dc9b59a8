type TickProps = {
  readonly label: string;
  readonly ticked: boolean;
  readonly onTick: (ticked: boolean) => void;
};

/** Something that is done or not. */
export const Tick = ({ label, ticked, onTick }: TickProps) => (
  <label className="flex min-h-10 cursor-pointer items-center gap-3 border-b border-rule py-1">
    <input
      type="checkbox"
      className="size-5 shrink-0 accent-brass"
      checked={ticked}
      onChange={(event) => onTick(event.currentTarget.checked)}
    />
    {label}
  </label>
);
