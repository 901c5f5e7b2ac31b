/* The few parts of smtp-server the tests stand on; the package carries no types of its own. */
declare module 'smtp-server' {
  import type { EventEmitter } from 'node:events'
  import type { Server, Socket } from 'node:net'
  import type { Readable } from 'node:stream'

  export interface SMTPServerSession {
    id: string
    envelope: { mailFrom: { address: string } | false; rcptTo: { address: string }[] }
  }
  export interface SMTPServerOptions {
    authOptional?: boolean
    disabledCommands?: string[]
    size?: number
    socketTimeout?: number
    closeTimeout?: number
    logger?: boolean
    onConnect?(session: SMTPServerSession, done: (error?: Error | null) => void): void
    onAuth?(
      auth: { username?: string; password?: string },
      session: SMTPServerSession,
      done: (error: Error | null, user?: { user: string }) => void,
    ): void
    onMailFrom?(
      address: { address: string },
      session: SMTPServerSession,
      done: (error?: Error | null) => void,
    ): void
    onRcptTo?(
      address: { address: string },
      session: SMTPServerSession,
      done: (error?: Error | null) => void,
    ): void
    onData?(
      stream: Readable,
      session: SMTPServerSession,
      done: (error?: Error | null, message?: string) => void,
    ): void
  }
  export class SMTPServer extends EventEmitter {
    constructor(options?: SMTPServerOptions)
    server: Server
    connections: Set<{ _socket: Socket }>
    listen(port: number, host: string, ready?: () => void): Server
    close(done?: () => void): void
  }
}
