interface Caller {
  /** The caller, as a trusted proxy names them. */
  readonly ip: string | undefined;
  readonly socket: { readonly remoteAddress?: string };
}

const loopback = /^(127\.|::1$|::ffff:127\.)/;

/** Whether both the connection and the caller a proxy names come from this very machine. */
export const isLoopback = ({ ip, socket }: Caller) => [ip, socket.remoteAddress].every((address) => loopback.test(address ?? ''));
