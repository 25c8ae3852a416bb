import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { useParams } from 'react-router-dom'
import { AfterAct } from './after-act'
import { LandownerPage } from './landowner-page'
import { MyPacket } from './my-packet'
import { NotNow } from './not-now'
import { ReasonForm, reasonActs, type ReasonWords } from './reason-form'
import { offeredAct } from './signing-steps'
import { WhileOffered } from './while-offered'

interface ReasonPageProps {
  words: ReasonWords
}

/** Withdrawing and taking a signature back are the same page with other words. */
export function ReasonPage({ words }: ReasonPageProps) {
  const { t } = useTranslation()
  const { jobId = '' } = useParams()
  const [isDone, setIsDone] = useState(false)
  if (isDone) {
    return (
      <LandownerPage key="done" title={t(`${words}.done`)}>
        <AfterAct jobId={jobId} sentence={t(`${words}.doneHow`)} />
      </LandownerPage>
    )
  }
  return (
    <MyPacket>
      {(job) => (
        <LandownerPage title={t(`${words}.title`)}>
          <WhileOffered
            isOffered={offeredAct(job, reasonActs[words])?.enabled === true}
            otherwise={<NotNow job={job} title={t('job.cannotOpen')} />}
          >
            <ReasonForm jobId={job.id} words={words} onDone={() => setIsDone(true)} />
          </WhileOffered>
        </LandownerPage>
      )}
    </MyPacket>
  )
}
