import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex } from '@noble/hashes/utils.js';

/** sha256 of a file, hexadecimal. A package, since Web Crypto is missing on plain http. */
export const fileSha256 = (bytes: Uint8Array): string => bytesToHex(sha256(bytes));
