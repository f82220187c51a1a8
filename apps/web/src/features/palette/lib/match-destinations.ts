export interface Destination {
  readonly to: string;
  readonly name: string;
  /** 'programme', 'design of Curlew 48', 'page'. */
  readonly kind: string;
}

const MOST = 40;

/** Places whose name or kind holds every word typed; those whose name begins with it first. */
export function matchDestinations(all: readonly Destination[], text: string): Destination[] {
  const words = text.toLowerCase().split(/\s+/u).filter(Boolean);
  const found = all.filter((place) => {
    const name = `${place.name} ${place.kind}`.toLowerCase();
    return words.every((word) => name.includes(word));
  });
  const first = words[0] ?? '';
  const begins = (place: Destination) => Number(!place.name.toLowerCase().startsWith(first));
  return found.toSorted((a, b) => begins(a) - begins(b)).slice(0, MOST);
}
