import { createServer } from 'node:http'
import { mkdirSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { simpleParser } from 'mailparser'
import { SMTPServer } from 'smtp-server'
import { mailPage, mailsPage } from './smtp-fake-pages.mjs'

/*
 * A mail server for one machine: takes every letter by real SMTP, keeps it as an .eml file and delivers nothing.
 * On loopback HTTP: a page to read them, JSON for tests, and a switch that makes it fail as real servers do.
 *
 *   GET /mails            all, oldest first: { id, messageId, from, to, subject, date, attachments }
 *   GET /mails/ID         the same with text and html      GET /mails/ID/raw      the .eml
 *   GET /mails/ID/attachments/N                            DELETE /mails          forgets all
 *   POST /failure         { "mode": "none" | "refuse" | "later" | "drop", "times"?: n }
 *     refuse: 550 for the recipient   later: 451   drop: takes the whole letter, then hangs up without a word
 */
const MODES = ['none', 'refuse', 'later', 'drop']

/** Starts both servers on loopback (port 0: any free one). `stop` ends them and every open connection. */
export async function startMailFake({ folder, smtpPort = 0, httpPort = 0 }) {
  mkdirSync(folder, { recursive: true })
  const state = { folder, failure: { mode: 'none', times: 0 }, number: 0 }
  const smtp = smtpServer(state)
  await new Promise((resolve, reject) => {
    smtp.once('error', reject)
    smtp.listen(smtpPort, '127.0.0.1', resolve)
  })
  smtp.on('error', () => undefined) // A client that hangs up is its own affair.
  const web = createServer((request, response) => {
    answer(state, request, response).catch((error) => reply(response, 500, { error: error.message }))
  })
  await new Promise((resolve, reject) => {
    web.once('error', reject)
    web.listen(httpPort, '127.0.0.1', resolve)
  })
  return {
    smtpUrl: `smtp://127.0.0.1:${smtp.server.address().port}`,
    webUrl: `http://127.0.0.1:${web.address().port}`,
    /** As POST /failure, for tests in the same process. */
    failWith: (mode, times = Infinity) => setFailure(state, { mode, times }),
    mails: () => readMails(folder),
    stop: async () => {
      web.closeAllConnections()
      await Promise.all([new Promise((done) => web.close(done)), new Promise((done) => smtp.close(done))])
    },
  }
}

function smtpServer(state) {
  const server = new SMTPServer({
    disableReverseLookup: true,
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    size: 40 * 1024 * 1024,
    closeTimeout: 500,
    onMailFrom(address, session, callback) {
      // Decided once a letter, so that all its recipients meet the same fate.
      session.fate = spend(state) ? state.failure.mode : 'none'
      callback()
    },
    onRcptTo(address, session, callback) {
      if (session.fate === 'refuse') return callback(smtpError(550, 'No such mailbox here.'))
      if (session.fate === 'later') return callback(smtpError(451, 'Try again later.'))
      callback()
    },
    onData(stream, session, callback) {
      const parts = []
      stream.on('data', (part) => parts.push(part))
      stream.on('end', () => {
        keep(state, Buffer.concat(parts), session.envelope)
        // The letter is here, but the sender never learns it.
        if (session.fate === 'drop') return hangUp(server, session)
        callback(null, 'Kept.')
      })
    },
  })
  return server
}

function hangUp(server, session) {
  for (const connection of server.connections) {
    if (connection.session === session) connection._socket.destroy()
  }
}

function smtpError(responseCode, message) {
  return Object.assign(new Error(message), { responseCode })
}

function setFailure(state, { mode, times = Infinity }) {
  if (!MODES.includes(mode)) throw new Error(`Mode “${mode}”: put one of ${MODES.join(', ')}.`)
  state.failure = { mode, times: mode === 'none' ? 0 : times }
}

/** Uses up one failure; true while there are any left. */
function spend(state) {
  if (state.failure.times <= 0) return false
  state.failure.times -= 1
  return true
}

/** The envelope's addresses stand in two lines of our own before the letter: Bcc and the like are not in the letter itself. */
function keep(state, bytes, envelope) {
  state.number += 1
  const name = `${String(Date.now()).padStart(14, '0')}-${String(state.number).padStart(4, '0')}`
  const to = envelope.rcptTo.map(({ address }) => address).join(', ')
  const head = `X-Envelope-From: ${envelope.mailFrom ? envelope.mailFrom.address : ''}\r\nX-Envelope-To: ${to}\r\n`
  writeFileSync(path.join(state.folder, `${name}.eml`), Buffer.concat([Buffer.from(head), bytes]))
}

async function readMails(folder) {
  const names = readdirSync(folder).filter((name) => name.endsWith('.eml'))
  return Promise.all(names.sort().map((name) => readMail(folder, name.slice(0, -4))))
}

async function readMail(folder, id) {
  const parsed = await simpleParser(readFileSync(path.join(folder, `${id}.eml`)), { skipImageLinks: true })
  return {
    id,
    messageId: parsed.messageId ?? '',
    from: parsed.from?.text ?? '',
    to: parsed.headers.get('x-envelope-to') ?? '',
    subject: parsed.subject ?? '',
    date: (parsed.date ?? new Date(0)).toISOString(),
    text: parsed.text ?? '',
    html: parsed.html || '',
    attachments: parsed.attachments.map(({ filename, contentType, size, content }) => ({
      filename: filename ?? '',
      contentType,
      size,
      content,
    })),
  }
}

async function answer(state, request, response) {
  // A page elsewhere must not read mails through the visitor's browser by pointing its own name at 127.0.0.1.
  if (!/^(127\.0\.0\.1|localhost):\d+$/.test(request.headers.host ?? ''))
    return reply(response, 403, { error: 'Loopback only.' })
  const [, first, id, part, number] = new URL(request.url, 'http://127.0.0.1').pathname.split('/')
  const { method } = request
  if (method === 'GET' && first === '') return html(response, mailsPage(await readMails(state.folder)))
  if (method === 'GET' && first === 'mails' && id === undefined)
    return reply(response, 200, (await readMails(state.folder)).map(withoutBodies))
  if (method === 'DELETE' && first === 'mails' && id === undefined) {
    for (const name of readdirSync(state.folder)) rmSync(path.join(state.folder, name))
    return reply(response, 200, {})
  }
  if (method === 'POST' && first === 'failure') {
    setFailure(state, await body(request))
    return reply(response, 200, state.failure)
  }
  if (method === 'GET' && (first === 'mails' || first === 'read') && /^\d+-\d+$/.test(id ?? '')) {
    if (!readdirSync(state.folder).includes(`${id}.eml`))
      return reply(response, 404, { error: 'No such mail.' })
    const mail = await readMail(state.folder, id)
    if (first === 'read') return html(response, mailPage(mail))
    if (part === undefined)
      return reply(response, 200, { ...withoutBodies(mail), text: mail.text, html: mail.html })
    if (part === 'raw')
      return bytes(response, 'message/rfc822', readFileSync(path.join(state.folder, `${id}.eml`)))
    const attachment = part === 'attachments' ? mail.attachments[Number(number)] : undefined
    if (attachment) return bytes(response, attachment.contentType, attachment.content)
  }
  return reply(response, 404, { error: 'Nothing here.' })
}

function withoutBodies({ text: _text, html: _html, attachments, ...mail }) {
  return { ...mail, attachments: attachments.map(({ content: _content, ...one }) => one) }
}

async function body(request) {
  const parts = []
  for await (const part of request) parts.push(part)
  return JSON.parse(Buffer.concat(parts).toString('utf8'))
}

function reply(response, status, value) {
  response.writeHead(status, {
    'content-type': 'application/json; charset=utf-8',
    'cache-control': 'no-store',
  })
  response.end(JSON.stringify(value))
}

function html(response, page) {
  response.writeHead(200, {
    'content-type': 'text/html; charset=utf-8',
    'cache-control': 'no-store',
    'content-security-policy':
      "default-src 'none'; style-src 'unsafe-inline'; img-src data:; frame-src 'self'",
  })
  response.end(page)
}

function bytes(response, contentType, content) {
  response.writeHead(200, {
    'content-type': contentType,
    'cache-control': 'no-store',
    'x-content-type-options': 'nosniff',
  })
  response.end(content)
}
