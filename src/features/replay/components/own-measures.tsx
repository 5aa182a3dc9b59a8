import { useMutation, useQuery } from '@tanstack/react-query';

import { coreMeasures } from '#shared/body/card.ts';
import type { CardInProgress } from '#shared/body/check-card.ts';
import { measureGuide } from '#shared/body/measure-guide.ts';

import { failureWords } from '../../../lib/failure-words.ts';
import { signedInHint } from '../../../lib/signed-in-hint.ts';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { Field } from '../../../ui/field.tsx';
import { LengthInput } from '../../../ui/length-input.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { faultOf, ownFrom, type OwnCard, type OwnDraft } from '../own-card.ts';
import { fetchCard, pickableCardsQuery } from '../queries.ts';

type OwnMeasuresProps = {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly card: OwnCard;
  readonly onCard: (card: OwnCard) => void;
  readonly drawn: OwnDraft;
  /** The card that lies on this browser's own drafting table. */
  readonly onTable?: CardInProgress | undefined;
};

/** A learner's own ten measures, typed or picked; with them the same steps are drawn beside the tutor's. */
export const OwnMeasures = (props: OwnMeasuresProps) => {
  const { open, onClose, card, onCard, drawn, onTable } = props;
  const clear = () => onCard({ unit: card.unit, texts: {}, further: {} });
  return (
    <Dialog title="My measures" open={open} onClose={onClose}>
      <p className="pt-2">
        Ten measures of your own draw the same steps beside these. They stay in this browser and are
        sent to nobody.
      </p>
      <Picker card={card} onCard={onCard} onTable={onTable} />
      <form
        className="mt-2 border-t border-rule"
        onSubmit={(event) => {
          event.preventDefault();
          if (drawn !== undefined && 'draft' in drawn) onClose();
        }}
      >
        {coreMeasures.map((measure) => (
          <Field
            key={measure}
            label={`${measureGuide[measure].label}, ${card.unit}`}
            message={faultOf(card, measure)}
          >
            {(wiring) => (
              <LengthInput
                wiring={wiring}
                name={`own.${measure}`}
                text={card.texts[measure] ?? ''}
                onType={(text) =>
                  onCard({ ...card, further: {}, texts: { ...card.texts, [measure]: text } })
                }
                onDone={() => undefined}
              />
            )}
          </Field>
        ))}
      </form>
      <div className="py-3" role="status">
        {drawn === undefined && <p className="text-slate">Drawn as soon as all ten are in.</p>}
        {drawn !== undefined && 'refused' in drawn && <Notice>{drawn.refused}</Notice>}
        {drawn !== undefined && 'draft' in drawn && (
          <p className="text-verdigris">✓ drawn beside the tutor’s</p>
        )}
      </div>
      <div className="flex gap-3">
        <Button kind="primary" onClick={onClose}>
          To the drawing
        </Button>
        <Button kind="quiet" onClick={clear}>
          Take mine away
        </Button>
      </div>
    </Dialog>
  );
};

type PickerProps = Pick<OwnMeasuresProps, 'card' | 'onCard' | 'onTable'>;

/** Cards there are already: on the table of this browser, and those an account keeps. */
const Picker = ({ card, onCard, onTable }: PickerProps) => {
  const kept = useQuery({ ...pickableCardsQuery, enabled: signedInHint(), retry: false });
  const picking = useMutation({
    mutationFn: fetchCard,
    onSuccess: ({ content }) => onCard(ownFrom(content.card, card.unit)),
  });
  const cards = kept.data?.filter(({ archived }) => !archived) ?? [];
  if (onTable === undefined && cards.length === 0) return null;
  return (
    <div className="flex flex-wrap gap-x-2 pt-2">
      {onTable !== undefined && (
        <Button kind="quiet" slim onClick={() => onCard(ownFrom(onTable, card.unit))}>
          Card on my drafting table
        </Button>
      )}
      {cards.map(({ id, name }) => (
        <Button key={id} kind="quiet" slim onClick={() => picking.mutate(id)}>
          {name}
        </Button>
      ))}
      {picking.error !== null && <Notice>{failureWords(picking.error)}</Notice>}
    </div>
  );
};
