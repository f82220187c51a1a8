import type { HelmetOptions } from 'helmet';

type Directives = NonNullable<
  Exclude<HelmetOptions['contentSecurityPolicy'], boolean | undefined>['directives']
>;

/**
 * Style elements that libraries of the web application add at run time, by the hash of their text: the plot library's
 * empty element and its map stylesheet, and the notices' stylesheet. Elements whose text varies (the scroll lock of the
 * dialogues) carry the nonce.
 */
const STYLE_HASHES = [
  "'sha256-47DEQpj8HBSa+/TImW+5JCeuQeRkm5NMpJWZG3hSuFU='",
  "'sha256-2GF9hCGTDj/GGFNlQA54jDdMGl2fvoeZmZjAvBSiAtM='",
  "'sha256-StEaX+se6YS7pqjzrzMIA0KaX9zF/8zAhvQXZAe5epY='",
];

/** What a page of ours may load: our own scripts and nothing else. */
export function pagePolicy(nonce: string): Directives {
  return {
    defaultSrc: ["'none'"],
    scriptSrc: ["'self'"],
    styleSrc: ["'self'"],
    styleSrcElem: ["'self'", ...STYLE_HASHES, `'nonce-${nonce}'`],
    styleSrcAttr: ["'unsafe-inline'"],
    imgSrc: ["'self'", 'data:', 'blob:'],
    fontSrc: ["'self'"],
    connectSrc: ["'self'"],
    workerSrc: ["'self'"],
    manifestSrc: ["'self'"],
    baseUri: ["'none'"],
    formAction: ["'self'"],
    frameAncestors: ["'none'"],
    objectSrc: ["'none'"],
  };
}
