import { useMutation, useQueryClient } from '@tanstack/react-query';

import { failureWords } from '../../../lib/failure-words.ts';
import { Button } from '../../../ui/button.tsx';
import { classesQuery, withdraw } from '../queries.ts';

type WithdrawButtonProps = { readonly classId: string; readonly title: string };

/** Ends a class at once. */
export const WithdrawButton = ({ classId, title }: WithdrawButtonProps) => {
  const client = useQueryClient();
  const ending = useMutation({
    mutationFn: () => withdraw(classId),
    onSettled: () => client.invalidateQueries({ queryKey: classesQuery.queryKey }),
  });
  return (
    <span className="flex items-center gap-2">
      <span role="status" className="text-sm text-madder">
        {ending.error !== null && failureWords(ending.error)}
      </span>
      <Button
        kind="quiet"
        slim
        aria-label={`Withdraw ${title}`}
        disabled={ending.isPending}
        onClick={() => ending.mutate()}
      >
        Withdraw
      </Button>
    </span>
  );
};
