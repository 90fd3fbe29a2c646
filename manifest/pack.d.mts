export function pack(base: string, from?: string, target?: string): string;
