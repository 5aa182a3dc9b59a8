import { Segmented } from '../../../ui/segmented.tsx';
import { depthChoices, depthHints, type DepthChoice } from '../depth-choices.ts';

type Props = { readonly choice: DepthChoice; readonly onChoose: (choice: DepthChoice) => void };

/** What becomes of the depths of the top edge on another body, with a sentence for the choice made. */
export const TopEdgeDepths = ({ choice, onChoose }: Props) => (
  <div>
    <p className="text-sm text-slate">Depths of the top edge</p>
    <Segmented
      legend="Depths of the top edge"
      choices={depthChoices}
      value={choice}
      onChoose={onChoose}
    />
    <p className="text-sm text-slate">{depthHints[choice]}</p>
  </div>
);
