export function inputsHash(folder: string): string;
