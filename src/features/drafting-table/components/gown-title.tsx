import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';

import { nameGown } from '../gown-queries.ts';

type GownTitleProps = {
  readonly gownId: string;
  readonly title: string;
  readonly onNamed: (title: string) => void;
};

/** The gown's name, to be changed where it stands; what was typed stays until it is kept. */
export const GownTitle = ({ gownId, title, onNamed }: GownTitleProps) => {
  const [text, setText] = useState(title);
  const naming = useMutation({
    mutationFn: (name: string) => nameGown(gownId, name),
    onSuccess: (_, name) => onNamed(name),
    retry: 3,
  });
  const done = () => {
    const name = text.trim();
    if (name === '') setText(title);
    else if (name !== title) naming.mutate(name);
  };
  return (
    <span className="block min-w-0 lg:w-64">
      <input
        aria-label="Name of the gown"
        name="title"
        type="text"
        autoComplete="off"
        maxLength={80}
        value={text}
        title={text}
        className="h-9 w-full min-w-0 rounded-one border border-transparent bg-transparent px-2 font-semibold text-ellipsis hover:border-rule"
        onChange={(event) => setText(event.currentTarget.value)}
        onBlur={done}
        onKeyDown={(event) => event.key === 'Enter' && event.currentTarget.blur()}
      />
      <span role="status" className="text-sm text-madder">
        {naming.isError && 'name not kept yet'}
      </span>
    </span>
  );
};
