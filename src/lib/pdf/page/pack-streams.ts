import { zlibSync } from 'fflate';

/** What pdfkit keeps from its types: one object of the file, with what was written into it. */
interface FileObject {
  compress: boolean;
  buffer: Uint8Array[];
  finalize(): void;
}

/**
 * Packs the file's streams with one implementation everywhere. Left alone, pdfkit takes zlib in Node and fflate in the
 * browser; both are right, but their bytes differ, and zlib's also between versions of Node.
 */
export function packStreams(doc: PDFKit.PDFDocument): void {
  const makesObjects = doc as unknown as { ref(data?: unknown): FileObject };
  const make = makesObjects.ref.bind(doc);
  makesObjects.ref = (data) => {
    const object = make(data);
    const finalize = object.finalize.bind(object);
    object.finalize = () => {
      if (object.compress && object.buffer.length > 0) {
        object.buffer = [zlibSync(joined(object.buffer))];
        object.compress = false;
      }
      finalize();
    };
    return object;
  };
}

/** Pieces of bytes as one. */
export function joined(parts: Uint8Array[]): Uint8Array<ArrayBuffer> {
  const whole = new Uint8Array(parts.reduce((sum, part) => sum + part.length, 0));
  let at = 0;
  for (const part of parts) {
    whole.set(part, at);
    at += part.length;
  }
  return whole;
}
