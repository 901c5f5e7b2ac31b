import { IncomingMessage, Server } from 'node:http'

/*
 * Loaded into the web server before anything else (--import). A request may claim any address in x-forwarded-for, and
 * next writes the real one there only where the header is absent: whoever rotates it would never meet a limit and would
 * stand in the audit trail under names of their choice. So what was claimed goes, and the connection's address is put.
 */

/** Headers only a proxy may write. Behind one that is trusted (TRUST_PROXY=yes) all of this is left alone. */
const FORWARDED = [
  'forwarded',
  'x-forwarded-for',
  'x-forwarded-host',
  'x-forwarded-port',
  'x-forwarded-proto',
  'x-real-ip',
]

// The words lib/env.ts takes for yes.
if (!/^(yes|true)$/i.test(process.env.TRUST_PROXY ?? '')) {
  const emit = Server.prototype.emit
  // Whatever the event: a request, an upgrade, or one that waits for "continue".
  Server.prototype.emit = function emitOwnAddress(event, ...args) {
    if (args[0] instanceof IncomingMessage) putOwnAddress(args[0])
    return emit.call(this, event, ...args)
  }
  // lib/auth/request-ip.ts believes the header only in a process where this has run.
  globalThis.steadfoldOwnAddress = true
}

function putOwnAddress({ headers, socket }) {
  for (const name of FORWARDED) delete headers[name]
  if (socket.remoteAddress) headers['x-forwarded-for'] = socket.remoteAddress
}
