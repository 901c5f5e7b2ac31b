import 'server-only'
import { Readable } from 'node:stream'
import MailComposer from 'nodemailer/lib/mail-composer/index.js'
import { parseConnectionUrl } from 'nodemailer/lib/shared/index.js'
import SMTPConnection from 'nodemailer/lib/smtp-connection/index.js'

export interface Letter {
  messageId: string
  from: string
  to: string
  subject: string
  text: string
  html: string
  date: Date
  attachments: { filename: string; content: Buffer; contentType: string }[]
}

/**
 * How far a sending got. `unsent`: nothing was handed over, and another time may do better. `refused`: the server said no,
 * for now or for good. `uncertain`: the letter was on its way when the line fell silent, so it may have arrived.
 */
export type Outcome =
  | { kind: 'sent'; response: string }
  | { kind: 'unsent'; reason: string }
  | { kind: 'refused'; forGood: boolean; reason: string }
  | { kind: 'uncertain'; reason: string }

export interface Transport {
  send(letter: Letter): Promise<Outcome>
}

/** How long each stage may be silent before it counts as broken. */
export interface Patience {
  connectMs: number
  greetMs: number
  silenceMs: number
}

const PATIENCE: Patience = { connectMs: 10_000, greetMs: 15_000, silenceMs: 60_000 }

/** Mails by SMTP, one connection a letter, so that it is beyond doubt how far each one got. Never throws. */
export function smtpTransport(smtpUrl: string, patience: Patience = PATIENCE): Transport {
  return {
    send: async (letter) => {
      try {
        const parcel = await pack(letter)
        return await hand(connectionTo(smtpUrl, patience), credentialsOf(smtpUrl), parcel)
      } catch (error) {
        // Every later error is an outcome of `hand`: what lands here never reached the server.
        return { kind: 'unsent', reason: error instanceof Error ? error.message : String(error) }
      }
    },
  }
}

interface Parcel {
  envelope: { from: string; to: string[]; size: number }
  bytes: Buffer
}

async function pack(letter: Letter): Promise<Parcel> {
  const node = new MailComposer({ ...letter, disableFileAccess: true, disableUrlAccess: true }).compile()
  const bytes = await node.build()
  const { from, to } = node.getEnvelope()
  return { envelope: { from: from === false ? '' : from, to, size: bytes.length }, bytes }
}

function connectionTo(smtpUrl: string, { connectMs, greetMs, silenceMs }: Patience): SMTPConnection {
  const { auth: _auth, ...address } = parseConnectionUrl(smtpUrl)
  return new SMTPConnection({
    ...address,
    connectionTimeout: connectMs,
    greetingTimeout: greetMs,
    socketTimeout: silenceMs,
    dnsTimeout: connectMs,
  })
}

function credentialsOf(smtpUrl: string): { user: string; pass: string } | null {
  const { username, password } = new URL(smtpUrl)
  return username === '' ? null : { user: decodeURIComponent(username), pass: decodeURIComponent(password) }
}

function hand(
  connection: SMTPConnection,
  credentials: { user: string; pass: string } | null,
  { envelope, bytes }: Parcel,
): Promise<Outcome> {
  const body = new Body(bytes)
  return new Promise((resolve) => {
    const settle = (outcome: Outcome) => {
      resolve(outcome)
      connection.close()
    }
    const broken = (error: SMTPConnection.SMTPError) => settle(outcomeOf(error, body.handedOver))
    connection.on('error', broken)
    connection.on('end', () => broken(new Error('The server closed the connection.')))
    const send = () =>
      connection.send(envelope, body, (error, info) => {
        if (error) return broken(error)
        resolve({ kind: 'sent', response: info.response })
        connection.quit()
      })
    connection.connect(() => {
      if (credentials === null) return send()
      // A wrong password is the firm's own fault, never the letter's: it stays unsent.
      connection.login({ credentials }, (error) =>
        error ? settle({ kind: 'unsent', reason: spoken(error) }) : send(),
      )
    })
  })
}

/** The letter's bytes, and whether the server asked for them (354): from then on silence proves nothing. */
class Body extends Readable {
  handedOver = false
  private readonly bytes: Buffer

  constructor(bytes: Buffer) {
    super()
    this.bytes = bytes
  }

  override _read() {
    this.push(this.bytes)
    this.push(null)
  }

  override pipe<T extends NodeJS.WritableStream>(destination: T, options?: { end?: boolean }): T {
    this.handedOver = true
    return super.pipe(destination, options)
  }
}

/** An answer in figures is certain at any stage (RFC 5321, 4.2.1): 4 is no for now, 5 is no for good. */
function outcomeOf(error: SMTPConnection.SMTPError, handedOver: boolean): Outcome {
  const reason = spoken(error)
  const { responseCode } = error
  if (responseCode !== undefined && responseCode >= 400) {
    return { kind: 'refused', forGood: responseCode >= 500, reason }
  }
  return handedOver ? { kind: 'uncertain', reason } : { kind: 'unsent', reason }
}

function spoken(error: SMTPConnection.SMTPError): string {
  return error.response ?? error.message
}
