/** What a comparison shows, as its link says: versions (?v=) and own drafts (?d=) in order, and which is the reference (?base=). */
export interface Selection {
  readonly items: readonly { readonly kind: 'version' | 'draft'; readonly id: string }[];
  readonly baseId: string | null;
}

export const MOST_COMPARED = 6;
const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/iu;

/** Reads the link; ids that are none and repeats are left out, more than six are refused by `problem`. */
export function readSelection(params: URLSearchParams): { selection: Selection; problem: string | null } {
  const items: Selection['items'][number][] = [];
  let bad = 0;
  for (const [name, id] of params) {
    if (name !== 'v' && name !== 'd') continue;
    if (!UUID.test(id)) bad += 1;
    else if (!items.some((item) => item.id === id))
      items.push({ kind: name === 'v' ? 'version' : 'draft', id });
  }
  const wanted = params.get('base');
  const baseId = items.find((item) => item.id === wanted)?.id ?? items[0]?.id ?? null;
  const problem =
    bad > 0
      ? `${bad === 1 ? 'One item' : `${bad} items`} of the link could not be read.`
      : items.length > MOST_COMPARED
        ? `The link names ${items.length}; at most ${MOST_COMPARED} are compared, the first ${MOST_COMPARED} are shown.`
        : null;
  return { selection: { items: items.slice(0, MOST_COMPARED), baseId }, problem };
}

/** The link of another selection; cursors stay. */
export function writeSelection(before: URLSearchParams, { items, baseId }: Selection): URLSearchParams {
  const next = new URLSearchParams(before);
  for (const name of ['v', 'd', 'base']) next.delete(name);
  for (const item of items) next.append(item.kind === 'version' ? 'v' : 'd', item.id);
  if (baseId !== null && items.some((item) => item.id === baseId) && items[0]?.id !== baseId)
    next.set('base', baseId);
  return next;
}

export function without(selection: Selection, id: string): Selection {
  const items = selection.items.filter((item) => item.id !== id);
  return { items, baseId: selection.baseId === id ? (items[0]?.id ?? null) : selection.baseId };
}
