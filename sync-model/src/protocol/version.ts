/**
 * The version of the sync round, and the oldest that the server still serves. The server is deployed before
 * the phones. Each version has one line in docs/protocol.md; a test hashes the message schemas against it.
 */
export const PROTOCOL_VERSION = 1;
export const PROTOCOL_VERSION_OLDEST = 1;
