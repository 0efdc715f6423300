import type { Diagnosis } from '$lib/stats/types';
import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import { documentText } from '../document-text';

/** sha256 of the file that the document is saved as, 64 hexadecimal digits. Web Crypto is missing on plain http. */
export const documentSha256 = (diagnosis: Diagnosis): string =>
  bytesToHex(sha256(utf8ToBytes(documentText(diagnosis))));
