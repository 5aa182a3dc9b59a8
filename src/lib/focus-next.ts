/**
 * Enter goes to the next field of the same card. After the last one the card is handed in: what comes then is for
 * the card to say.
 */
export function focusNext(from: HTMLInputElement): void {
  const { form } = from;
  if (form === null) return;
  const fields = [...form.querySelectorAll<HTMLInputElement>('input[name]:not([type=radio])')];
  const next = fields[fields.indexOf(from) + 1];
  if (next !== undefined) {
    next.focus();
    return;
  }
  from.blur();
  form.requestSubmit();
}
