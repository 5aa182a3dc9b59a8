import { draftGarment } from '#shared/api/drafts.ts';
import { answerOrders } from '../http/thread-work.ts';
import type { DraftOrder } from './draft-order.ts';
import { draftAnyOrRefuse } from './draft-or-refuse.ts';
import { drawn } from './drawing.ts';
import { redrawingOf } from './redrawing.ts';

/** Written to its last letter here: a draft's JSON takes as long to write as some gowns to draw. */
function replyTo(inputs: Parameters<typeof draftAnyOrRefuse>[0]): Uint8Array {
  const draft = draftGarment.reply.schema.parse(draftAnyOrRefuse(inputs, 'cm'));
  return new TextEncoder().encode(JSON.stringify(draft));
}

answerOrders((posted) => {
  const order = orderIn(posted);
  switch (order.what) {
    case 'reply':
      return replyTo(order.inputs);
    case 'drawing':
      return drawn(order.content);
    case 'redrawing':
      return redrawingOf(order.before);
  }
});

/** The drafter posts nothing else. */
function orderIn(posted: unknown): DraftOrder {
  return posted as DraftOrder;
}
