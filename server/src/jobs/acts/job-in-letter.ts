import type { JobInLetter } from '../../mail/mail.service.js'
import type { Job } from '../job.entity.js'

export const jobInLetter = ({ id, number, title }: Job): JobInLetter => ({ jobId: id, number, title })
