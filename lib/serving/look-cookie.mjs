/** The cookie that holds the reader's look (lib/look.ts), as a header brings it. */
export const LOOK_COOKIE_PATTERN = /(?:^|;\s*)look=([a-z]{1,8}-[a-z]{1,8})(?=;|$)/
