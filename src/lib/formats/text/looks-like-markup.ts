/** Whether a text is a web page or an XML file, by how it opens. */
export function looksLikeMarkup(text: string): boolean {
  return /^\s*<(!doctype|html|\?xml|table|svg|!--)/i.test(text);
}
