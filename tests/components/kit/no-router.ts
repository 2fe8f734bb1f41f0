/** Stands for the router on the kit page. */
export const router = { push: (_path: string): void => {} }
