import { EntryCode } from './accounts/entry-code.entity.js'
import { EntryLink } from './accounts/entry-link.entity.js'
import { Membership } from './accounts/membership.entity.js'
import { Person } from './accounts/person.entity.js'
import { Session } from './accounts/session.entity.js'
import { SignInAttempt } from './accounts/sign-in-attempt.entity.js'
import { Design } from './designs/design.entity.js'
import { Revision } from './designs/revision.entity.js'
import { CostList } from './districts/cost-list.entity.js'
import { CriteriaSet } from './districts/criteria-set.entity.js'
import { DistrictSetting } from './districts/district-setting.entity.js'
import { District } from './districts/district.entity.js'
import { JobProducer } from './jobs/job-producer.entity.js'
import { Job } from './jobs/job.entity.js'
import { Variance } from './jobs/variance.entity.js'
import { MailMessage } from './mail/mail-message.entity.js'
import { Packet } from './packets/packet.entity.js'
import { PageReading } from './packets/page-reading.entity.js'
import { TechnicalCheck } from './packets/technical-check.entity.js'
import { EventRow } from './platform/events/event.entity.js'
import { IdempotencyKey } from './platform/idempotency/idempotency-key.entity.js'
import { StoredFile } from './platform/storage/file.entity.js'
import { Producer } from './producers/producer.entity.js'
import { Approval } from './reviews/approval.entity.js'
import { NoteAnswer } from './reviews/note-answer.entity.js'
import { Note } from './reviews/note.entity.js'
import { PaymentSchedule } from './schedules/payment-schedule.entity.js'
import { ScheduleLineRow } from './schedules/schedule-line.entity.js'
import { Consent } from './signatures/consent.entity.js'
import { Signature } from './signatures/signature.entity.js'
import { Survey } from './surveys/survey.entity.js'

/** Every table of Wadestone. A new entity is entered here and in a migration. */
export const entities = [
  Approval,
  Consent,
  CostList,
  CriteriaSet,
  Design,
  District,
  DistrictSetting,
  EntryCode,
  EntryLink,
  EventRow,
  IdempotencyKey,
  Job,
  JobProducer,
  MailMessage,
  Membership,
  Note,
  NoteAnswer,
  Packet,
  PageReading,
  PaymentSchedule,
  Person,
  Producer,
  Revision,
  ScheduleLineRow,
  Session,
  SignInAttempt,
  Signature,
  StoredFile,
  Survey,
  TechnicalCheck,
  Variance,
]
