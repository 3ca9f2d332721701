// Its own, so that the folders above are not searched for one.
export function register() {}
