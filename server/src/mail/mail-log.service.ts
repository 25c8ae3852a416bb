import { Injectable } from '@nestjs/common'
import type { MailView } from 'shared'
import type { Tx } from '../platform/database/tx.js'

interface MailRow extends Omit<MailView, 'queuedAt' | 'sentAt' | 'attachment'> {
  queuedAt: Date
  sentAt: Date | null
  attachmentName: string | null
  attachmentSha256: string | null
}

const mailQuery = `
  select m.id, m.kind, m.to_address as "to", m.subject, m.message_id as "messageId", m.status, m.attempts,
    m.queued_at as "queuedAt", m.sent_at as "sentAt", m.last_error as "lastError", m.is_secret as "isSecret",
    m.attachment_name as "attachmentName", f.sha256 as "attachmentSha256"
  from mail_messages m
  left join files f on f.district_id = m.district_id and f.id = m.attachment_file_id
  where m.district_id = $1 and m.job_id = $2
  order by m.queued_at, m.id
`

/** What went out for a job. The text is never shown: it may carry somebody's way in. */
@Injectable()
export class MailLogService {
  async ofJob(tx: Tx, jobId: string): Promise<MailView[]> {
    const rows: MailRow[] = await tx.manager.query(mailQuery, [tx.districtId, jobId])
    return rows.map(({ attachmentName, attachmentSha256, queuedAt, sentAt, ...row }) => ({
      ...row,
      queuedAt: queuedAt.toISOString(),
      sentAt: sentAt?.toISOString() ?? null,
      attachment:
        attachmentName === null || attachmentSha256 === null
          ? null
          : { filename: attachmentName, sha256: attachmentSha256 },
    }))
  }
}
