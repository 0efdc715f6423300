import { packDocument, unpackDocument, type PackedDocument } from '$lib/model/packed-document';
import { packMap, unpackMap, type PackedMap } from '$lib/model/packed-map';
import type { Transport } from '@sveltejs/kit';

/** How a long document travels from server to page; short ones go as they are. */
export const transport: Transport = {
  LongDocument: { encode: packDocument, decode: (packed: PackedDocument) => unpackDocument(packed) },
  LongMap: { encode: packMap, decode: (packed: PackedMap) => unpackMap(packed) }
};
