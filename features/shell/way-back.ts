/** Sign-in stands between a person and the page that was asked for; these two keep the way. */

/** Path of sign-in that leads back to the page in the address bar. */
export function signInPath(): string {
  const here = globalThis.location as Location | undefined
  const asked = here ? `${here.pathname}${here.search}` : '/'
  return asked === '/' ? '/sign-in' : `/sign-in?to=${encodeURIComponent(asked)}`
}

/**
 * Where to go after sign-in. The address comes from outside: only a path of this product is followed, never another
 * site ("//elsewhere", which a browser also reads in "/\elsewhere") and never sign-in itself.
 */
export function pathAfterSignIn(asked: string | undefined): string {
  if (asked === undefined || !/^\/(?![/\\])/.test(asked) || /[\t\r\n]/.test(asked)) return '/'
  return /^\/sign-in(?![^?#/])/.test(asked) ? '/' : asked
}
