export function startOptions(args: readonly string[]): { port: number; open: boolean } | string;
