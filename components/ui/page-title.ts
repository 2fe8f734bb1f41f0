/** Native screens have no window title. */
export function usePageTitle(_title: string): void {}
