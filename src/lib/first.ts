/**
 * Imported before anything else in the browser. Under the site's content security policy nothing may
 * compile code from text, and styles put in at run time must carry the page's nonce.
 */
const meta = document.querySelector<HTMLMetaElement>('meta[property="csp-nonce"]');

/** The nonce of this page's content security policy. */
export const pageNonce = meta?.nonce ?? "";

Object.assign(globalThis, { __zod_globalConfig: { jitless: true }, __webpack_nonce__: pageNonce });
