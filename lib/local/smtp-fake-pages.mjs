/** The page that lists all mails, newest first. */
export function mailsPage(mails) {
  const rows = [...mails].reverse().map(
    (mail) => `<tr><td>${escape(when(mail.date))}</td><td>${escape(mail.to)}</td>
      <td><a href="/read/${mail.id}">${escape(mail.subject || '(no subject)')}</a></td><td>${mail.attachments.length || ''}</td></tr>`,
  )
  const table = `<table><thead><tr><th>Sent</th><th>To</th><th>Subject</th><th>Files</th></tr></thead><tbody>${rows.join('')}</tbody></table>`
  return page(
    'Mails',
    `<h1>Mails kept on this machine</h1>${mails.length === 0 ? '<p>No mail yet.</p>' : table}`,
  )
}

/** One mail: who, what, its files, and both of its bodies. */
export function mailPage(mail) {
  const files = mail.attachments.map(
    ({ filename, size }, index) =>
      `<li><a href="/mails/${mail.id}/attachments/${index}" download="${escape(filename)}">${escape(filename)}</a>, ${size} bytes</li>`,
  )
  return page(
    mail.subject,
    `<p><a href="/">All mails</a></p><h1>${escape(mail.subject)}</h1>
     <p>From ${escape(mail.from)}<br>To ${escape(mail.to)}<br>${escape(when(mail.date))}</p>
     ${files.length === 0 ? '' : `<ul>${files.join('')}</ul>`}
     ${mail.html === '' ? '' : `<iframe sandbox title="The letter" srcdoc="${escape(mail.html)}"></iframe>`}
     <h2>As plain text</h2><pre>${escape(mail.text)}</pre><p><a href="/mails/${mail.id}/raw">The file as it came</a></p>`,
  )
}

function page(title, content) {
  return `<!doctype html><html lang="en"><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<title>${escape(title)}</title><style>
body{font:16px/24px system-ui,sans-serif;max-width:60rem;margin:2rem auto;padding:0 1rem}
table{border-collapse:collapse;width:100%}th,td{text-align:left;padding:6px 12px 6px 0;border-bottom:1px solid #bbb;vertical-align:top}
iframe{width:100%;height:32rem;border:1px solid #bbb}pre{white-space:pre-wrap}
</style>${content}</html>`
}

function when(date) {
  return `${date.slice(0, 16).replace('T', ' ')} UTC`
}

function escape(text) {
  const entities = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' }
  return String(text).replace(/[&<>"]/g, (sign) => entities[sign])
}
