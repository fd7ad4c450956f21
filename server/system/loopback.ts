import type { Request } from 'express';

const loopback = /^(127\.|::1$|::ffff:127\.)/;

/** Whether both the connection and the caller a proxy names come from this very machine. */
export const isLoopback = (request: Request) => [request.ip, request.socket.remoteAddress].every((address) => loopback.test(address ?? ''));
