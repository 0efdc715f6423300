type Field = HTMLInputElement | HTMLTextAreaElement | HTMLSelectElement;

const fieldsOf = (place: HTMLElement): Field[] => [
  ...place.querySelectorAll<Field>('input, textarea, select')
];

/**
 * What a reader has typed, chosen and opened in a part before it is made live: making it live gives fields the values they
 * were drawn with, and closes folds.
 *
 * @returns what puts it back, and tells the part of it as if it were typed then
 */
export function keepTyped(place: HTMLElement): () => void {
  const fields = fieldsOf(place);
  const typed = fields.map(typedInto);
  const open = [...place.querySelectorAll('details')].map((fold) => fold.open);
  const focused = fields.findIndex((field) => field === document.activeElement);
  const caret = focused < 0 ? null : caretOf(fields[focused]);

  return () => {
    place.querySelectorAll('details').forEach((fold, i) => open[i] && (fold.open = true));
    const now = fieldsOf(place);
    now.forEach((field, i) => typed[i]?.(field));
    if (focused < 0 || !now[focused]) return;
    now[focused].focus({ preventScroll: true });
    if (caret) (now[focused] as HTMLTextAreaElement).setSelectionRange(...caret);
  };
}

/** What does to a field again what its reader did; null where it stands as it was drawn. */
function typedInto(field: Field): ((to: Field) => void) | null {
  if (field instanceof HTMLInputElement && ['radio', 'checkbox'].includes(field.type)) {
    const { checked } = field;
    // Of radio buttons the one that was chosen tells for the others.
    if (checked === field.defaultChecked || (field.type === 'radio' && !checked)) return null;
    return (to) => tell(to, () => ((to as HTMLInputElement).checked = checked));
  }
  const { value } = field;
  return value === drawnValue(field) ? null : (to) => tell(to, () => (to.value = value));
}

function drawnValue(field: Field): string {
  if (!(field instanceof HTMLSelectElement)) return field.defaultValue;
  const options = [...field.options];
  return (options.find((option) => option.defaultSelected) ?? options[0])?.value ?? '';
}

function tell(field: Field, change: () => void): void {
  change();
  field.dispatchEvent(new Event('input', { bubbles: true }));
  field.dispatchEvent(new Event('change', { bubbles: true }));
}

/** Where the caret stands, in fields that have one to speak of. */
function caretOf(field: Field): [number, number] | null {
  if (field instanceof HTMLSelectElement || field.selectionStart === null) return null;
  return [field.selectionStart, field.selectionEnd ?? field.selectionStart];
}
