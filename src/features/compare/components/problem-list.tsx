import type { Problem } from '#shared/units/problem.ts';
import type { Unit } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';

import { Notice } from '../../../ui/notice.tsx';

/** Why something cannot be drawn, each reason once. */
export const ProblemList = ({
  title,
  problems,
  unit,
}: {
  title: string;
  problems: readonly Problem[];
  unit: Unit;
}) => (
  <Notice>
    <p className="font-semibold">{title}</p>
    <ul>
      {problems.map((problem) => {
        const words = speak(problem.said, unit);
        return <li key={words}>{words}</li>;
      })}
    </ul>
  </Notice>
);
