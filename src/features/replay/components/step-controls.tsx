import { Button } from '../../../ui/button.tsx';
import { Segmented } from '../../../ui/segmented.tsx';
import { paces, type Steps } from '../use-steps.ts';

type StepControlsProps = { readonly steps: Steps; readonly bare?: boolean };

/** Back, play or pause, forward, and where among all the steps one is. */
export const StepControls = ({ steps, bare = false }: StepControlsProps) => {
  const { place, last, playing, pace, go, play, setPace } = steps;
  return (
    <div className="flex flex-wrap items-center gap-x-3 gap-y-2">
      <div className="flex gap-2">
        <Button slim className="min-w-11" disabled={place === 0} onClick={() => go(place - 1)}>
          Back
        </Button>
        <Button slim className="w-18" onClick={() => play(!playing)}>
          {playing ? 'Pause' : 'Play'}
        </Button>
        <Button
          kind="primary"
          slim
          className="min-w-11"
          disabled={place === last}
          onClick={() => go(place + 1)}
        >
          Forward
        </Button>
      </div>
      <span className="figures text-slate">{`${String(place + 1)} of ${String(last + 1)}`}</span>
      {!bare && (
        <Segmented legend="Pace of playing" choices={paces} value={pace} onChoose={setPace} />
      )}
    </div>
  );
};
