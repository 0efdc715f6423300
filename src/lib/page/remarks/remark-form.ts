/** What a page's action gives back to the form it came from. */
export interface RemarkForm {
  section: string;
  threadId: string;
  body: string;
  message: string;
}
