import type { APIRequestContext } from '@playwright/test'
import { expect } from '@playwright/test'

interface KeptMail {
  id: string
  to: string
  subject: string
  attachments: { filename: string; contentType: string }[]
}

const address = () => process.env.E2E_MAIL_URL ?? 'http://127.0.0.1:8025'

/** Waits until a mail with a paper, whose subject begins so, has arrived at the mail server, and gives its first attachment. */
export async function mailedPdf(
  request: APIRequestContext,
  subjectStart: string,
): Promise<{ mail: KeptMail; pdf: Buffer }> {
  let found: KeptMail | undefined
  await expect
    .poll(
      async () => {
        const mails = (await (await request.get(`${address()}/mails`)).json()) as KeptMail[]
        found = mails.find((mail) => mail.attachments.length > 0 && mail.subject.startsWith(subjectStart))
        return found !== undefined
      },
      { timeout: 60_000, message: `a mail with a paper whose subject begins “${subjectStart}”` },
    )
    .toBe(true)
  if (found === undefined) throw new Error('The mail went missing.')
  const response = await request.get(`${address()}/mails/${found.id}/attachments/0`)
  return { mail: found, pdf: await response.body() }
}
