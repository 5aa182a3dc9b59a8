import { useMutation } from '@tanstack/react-query';
import { useReducer, useRef, useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';

import { createGown } from '#shared/api/gowns.ts';
import { garmentTitles } from '#shared/exports/garment-titles.ts';

import { call } from '../../../lib/call.ts';
import { newId } from '../../../lib/new-id.ts';
import { signedInHint } from '../../../lib/signed-in-hint.ts';
import { Button } from '../../../ui/button.tsx';
import { bench } from '../bench.ts';
import {
  clearKeptTable,
  keepTable,
  keepTableHistory,
  keptTableHistory,
  readersTable,
} from '../saved-table.ts';
import { triedGown } from '../tried-gown.ts';
import { useKeeping } from '../use-keeping.ts';
import { workOf } from '../table-inputs.ts';
import { DraftingTable } from './drafting-table.tsx';

/** The drafting table without an account: kept in this browser alone until somebody takes it along. */
export const TryTable = () => {
  const [state, dispatch] = useReducer(bench, undefined, () => {
    const table = readersTable();
    return { table, history: keptTableHistory(table) };
  });
  const [kept, setKept] = useState(true);
  const taken = useRef(false);
  const { table, history } = state;
  const keep = () => {
    if (taken.current) return;
    setKept(keepTable(table));
    keepTableHistory(history);
  };
  useKeeping(keep, [table.unit, ...workOf(table), history]);
  return (
    <DraftingTable
      bench={state}
      dispatch={dispatch}
      place="try"
      places={
        signedInHint() ? (
          <Link to="/gowns" className="text-slate hover:text-ink">
            Gowns
          </Link>
        ) : undefined
      }
      heading={
        <>
          <p className="min-w-0 truncate">
            {table.name === ''
              ? `A ${garmentTitles[table.garment].toLowerCase()} to try`
              : `${table.name} · ${garmentTitles[table.garment].toLowerCase()}`}
          </p>
          <p
            className={`hidden shrink-0 text-sm sm:block ${kept ? 'text-verdigris' : 'text-madder'}`}
          >
            {kept ? '✓ kept in this browser' : 'This browser keeps nothing: print before you leave'}
          </p>
          <span className="ml-auto shrink-0">
            {signedInHint() ? (
              <KeepAsGown
                onKept={() => {
                  taken.current = true;
                  clearKeptTable();
                }}
                prepare={keep}
              />
            ) : (
              <Link to="/sign-up" className="text-brass underline underline-offset-4">
                Keep it
              </Link>
            )}
          </span>
        </>
      }
    />
  );
};

type KeepAsGownProps = { readonly prepare: () => void; readonly onKept: () => void };

/** Takes what lies here along into the account, as a gown of its own. */
const KeepAsGown = ({ prepare, onKept }: KeepAsGownProps) => {
  const navigate = useNavigate();
  const saveId = useRef(newId());
  const keeping = useMutation({
    mutationFn: async () => {
      prepare();
      const gown = triedGown();
      return gown && call(createGown, { saveId: saveId.current, ...gown });
    },
    onSuccess: (kept) => {
      if (kept === undefined) return;
      onKept();
      void navigate(`/gowns/${kept.id}`);
    },
  });
  return (
    <Button kind="quiet" slim disabled={keeping.isPending} onClick={() => keeping.mutate()}>
      {keeping.isError ? 'Not kept: try again' : 'Keep as a gown'}
    </Button>
  );
};
