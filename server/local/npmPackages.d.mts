export function findMismatch(root: string): string | null;
