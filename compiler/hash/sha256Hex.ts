import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';

/** SHA-256 of the text's UTF-8 bytes as 64 lower-case hex digits (FIPS 180-4). */
export function sha256Hex(text: string): string {
  return sha256HexOf(utf8ToBytes(text));
}

/** SHA-256 of bytes as 64 lower-case hex digits. */
export function sha256HexOf(bytes: Uint8Array): string {
  return bytesToHex(sha256(bytes));
}
