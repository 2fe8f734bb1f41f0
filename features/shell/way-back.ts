/** Sign-in stands between a person and the page that was asked for; these two keep the way. */

/** Page in the address bar, with what it asks for. */
export function pageInAddressBar(): string {
  const here = globalThis.location as Location | undefined
  return here ? `${here.pathname}${here.search}` : '/'
}

/** Path of sign-in that leads back to the page that was asked for. */
export function signInPath(asked: string): string {
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
