/** Where a pointer is in a drawing that its page may have scaled, in the drawing's own units. */
export function pointIn(
  drawing: Element,
  width: number,
  { clientX, clientY }: { clientX: number; clientY: number }
): [x: number, y: number] {
  const box = drawing.getBoundingClientRect();
  const scale = width / box.width;
  return [(clientX - box.left) * scale, (clientY - box.top) * scale];
}
