import { ServerResponse } from 'node:http'

const NAME = 'content-security-policy'

/**
 * Lets a page's own policy take the place of the strict one every answer starts with. Next adds the headers of a stored
 * page to those already there, and a browser obeys every policy it is given: together they would allow no script.
 */
export function keepOnePolicy(): void {
  const { appendHeader } = ServerResponse.prototype
  ServerResponse.prototype.appendHeader = function (name, value) {
    return name.toLowerCase() === NAME ? this.setHeader(name, value) : appendHeader.call(this, name, value)
  }
}
