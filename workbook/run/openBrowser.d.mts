export function openerOf(platform: string, env: Readonly<Record<string, string | undefined>>): string[] | null;
