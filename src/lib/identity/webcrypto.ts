/** The one place of this room that touches WebCrypto: the same object in Node 20, in a browser tab and in a worker. */
export const { subtle } = globalThis.crypto;

/** Where unguessable bytes come from. An argument wherever bytes are chosen, so that everything else is a pure function. */
export type Random = (length: number) => Uint8Array<ArrayBuffer>;

export const webRandom: Random = (length) => globalThis.crypto.getRandomValues(new Uint8Array(length));

export const P256 = { name: 'ECDSA', namedCurve: 'P-256' } as const;

export const ES256 = { name: 'ECDSA', hash: 'SHA-256' } as const;
