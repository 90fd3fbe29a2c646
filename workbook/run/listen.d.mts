import type { Server } from 'node:http';
export function listen(server: Server, port: number): Promise<number>;
