export function isBuilt(folder: string): boolean;
export function build(): Promise<void>;
