export function hostFiles(origin: string): [path: string, text: string][];
