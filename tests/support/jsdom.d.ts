declare module 'jsdom' {
  /** Only what the tests use: a document from text. */
  export class JSDOM {
    constructor(html: string);
    readonly window: { readonly document: Document };
  }
}
