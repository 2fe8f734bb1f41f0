/** On a device everything is in the one file that the app came with. */
export const behindJobs = <T>(load: () => Promise<T>): Promise<T> => load()
