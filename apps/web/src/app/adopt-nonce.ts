/** The nonce of the page, where the style element of the dialogues' scroll lock looks for it. */
export function adoptNonce(): void {
  const nonce = document.querySelector<HTMLMetaElement>('meta[name="csp-nonce"]')?.content;
  if (nonce !== undefined) Object.assign(globalThis, { __webpack_nonce__: nonce });
}
