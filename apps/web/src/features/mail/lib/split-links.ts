export interface TextPart {
  readonly text: string;
  readonly isLink: boolean;
}

/** A plain text cut into words and addresses. Only http(s) addresses become links. */
export function splitLinks(text: string): TextPart[] {
  return text
    .split(/(https?:\/\/[^\s<>"]+)/u)
    .filter((part) => part !== '')
    .map((part) => ({ text: part, isLink: /^https?:\/\//u.test(part) }));
}
