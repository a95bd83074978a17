/** Stands in for next/cache in tests: there is no page to make anew. */
export function refresh(): void {}
export function revalidatePath(): void {}
