/** Native screens have no tab order to skip. */
export function SkipLink() {
  return null
}
