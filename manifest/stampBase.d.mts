export const LOCAL_BASE: string;
export function hostBase(text: string): string;
export function stampBase(text: string, base: string): string;
