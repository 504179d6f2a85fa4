/** A kept photo as it can be shown. */
export type ShownPhoto = { readonly name: string; readonly url: string; readonly hash: string };
