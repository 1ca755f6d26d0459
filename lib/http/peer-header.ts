/** Under this name a request carries the address of its connection; see note-peers.ts and callFrom(). */
export const PEER_HEADER = "x-boardwake-peer";
