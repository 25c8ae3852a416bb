// A mail server on loopback that keeps each message as a file and shows them on one page.
import { mkdirSync, readdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs'
import { createServer } from 'node:http'
import { join } from 'node:path'
import { simpleParser } from 'mailparser'
import { SMTPServer } from 'smtp-server'

const folder = process.env.MAIL_FOLDER
mkdirSync(folder, { recursive: true })
let count = 0

async function readAll(stream) {
  const chunks = []
  for await (const chunk of stream) chunks.push(chunk)
  return Buffer.concat(chunks)
}

/** Written under another name first, so that no reader ever sees half a message. */
function keep(bytes) {
  count += 1
  const stem = `${new Date().toISOString().replaceAll(':', '-')}-${String(count).padStart(4, '0')}`
  writeFileSync(join(folder, `${stem}.part`), bytes)
  renameSync(join(folder, `${stem}.part`), join(folder, `${stem}.eml`))
}

const smtp = new SMTPServer({
  authOptional: true,
  disabledCommands: ['AUTH', 'STARTTLS'],
  onData(stream, _session, done) {
    readAll(stream).then((bytes) => {
      keep(bytes)
      done()
    }, done)
  },
})

const escape = (text) => text.replace(/[&<>"]/g, (sign) => `&#${sign.charCodeAt(0)};`)

async function page() {
  const names = readdirSync(folder)
    .filter((name) => name.endsWith('.eml'))
    .sort()
    .reverse()
    .slice(0, 100)
  const mails = await Promise.all(
    names.map(async (name) => ({ name, mail: await simpleParser(readFileSync(join(folder, name))) })),
  )
  const items = mails.map(({ name, mail }) => {
    const files = mail.attachments.map((file) => escape(file.filename ?? 'file')).join(', ')
    const body = escape(mail.text ?? '').replace(
      /http:\/\/127\.0\.0\.1\S+/g,
      (link) => `<a href="${link}">${link}</a>`,
    )
    return `<article><h2>${escape(mail.subject ?? '')}</h2><p>To ${escape(mail.to?.text ?? '')}, ${escape(
      mail.date?.toISOString() ?? '',
    )}${files ? `, with ${files}` : ''}. <a href="/${encodeURIComponent(name)}">The message itself</a></p><pre>${body}</pre></article>`
  })
  return `<!doctype html><html lang="en"><meta charset="utf-8"><title>Caught mail</title><style>body{font:16px/1.4 sans-serif;max-width:50rem;margin:2rem auto;padding:0 1rem}article{border-top:1px solid #999}pre{white-space:pre-wrap}</style><h1>Caught mail</h1><p>Nothing here has left this machine.</p>${
    items.join('') || '<p>No mail yet.</p>'
  }</html>`
}

const web = createServer(async (request, response) => {
  const name = decodeURIComponent(new URL(request.url, 'http://mail').pathname.slice(1))
  if (name === '') {
    response.setHeader('content-type', 'text/html; charset=utf-8')
    response.end(await page())
  } else if (/^[\w.-]+\.eml$/.test(name) && readdirSync(folder).includes(name)) {
    response.setHeader('content-type', 'message/rfc822')
    response.end(readFileSync(join(folder, name)))
  } else {
    response.statusCode = 404
    response.end('No such message')
  }
})

smtp.listen(Number(process.env.SMTP_PORT), '127.0.0.1')
web.listen(Number(process.env.MAIL_PAGE_PORT), '127.0.0.1')

process.on('SIGTERM', () => {
  web.closeAllConnections()
  web.close()
  smtp.close(() => process.exit(0))
})
