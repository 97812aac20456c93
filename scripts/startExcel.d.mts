export function adviceFor(platform: string): string | undefined;
