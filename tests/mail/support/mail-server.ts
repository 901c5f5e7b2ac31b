import type { AddressInfo } from 'node:net'
import { type ParsedMail, simpleParser } from 'mailparser'
import { SMTPServer, type SMTPServerOptions } from 'smtp-server'

export interface MailServer {
  url: string
  /** What was taken in, in order. */
  taken: ParsedMail[]
  /** Breaks every open line at once. */
  cut(): void
  close(): Promise<void>
}

/** A real SMTP server on a free port of this machine; `options` make it refuse, hesitate or fall silent. */
export async function mailServer(options: SMTPServerOptions = {}): Promise<MailServer> {
  const taken: ParsedMail[] = []
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    closeTimeout: 50,
    onData: (stream, _session, done) => {
      simpleParser(stream).then((mail) => {
        taken.push(mail)
        done(null, 'taken')
      }, done)
    },
    ...options,
  })
  // A line we break ourselves is an error to the server too.
  server.on('error', () => undefined)
  await new Promise<void>((ready) => server.listen(0, '127.0.0.1', ready))
  const { port } = server.server.address() as AddressInfo
  return {
    url: `smtp://127.0.0.1:${port}?ignoreTLS=true`,
    taken,
    cut: () => server.connections.forEach((connection) => connection._socket.destroy()),
    close: () => new Promise((done) => server.close(done)),
  }
}

/** An answer of the server with its code, e.g. answer(451, 'Try later'). */
export function answer(responseCode: number, message: string): Error {
  return Object.assign(new Error(message), { responseCode })
}
