export function whyNot(platform: string): string | null;
