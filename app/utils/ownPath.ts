/**
 * True for a path on this site: one slash, then anything but a slash or backslash. Whatever a person typed must pass here before
 * it may steer a navigation.
 */
export const isOwnPath = (path: string): boolean => /^\/(?![/\\])/.test(path)

/** The path itself where it is one on this site, else the home page. */
export const safePath = (path: string): string => isOwnPath(path) ? path : '/'
