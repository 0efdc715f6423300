/** What a page's action gives back to the form it came from. */
export interface RemarkForm {
  section: string;
  threadId: string;
  body: string;
  /** Name that was typed with it, where the reader may sign. */
  signedAs?: string;
  message: string;
}
