/** Forms of remarks stand all over a page; each takes along, when it is sent, how the reader signs (SignedAs). */
export function takeSignature({ formData }: FormDataEvent): void {
  const field = document.getElementById('signed-as');
  if (field instanceof HTMLInputElement && formData.has('body')) formData.set('signedAs', field.value);
}
