import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { useParams, useSearchParams } from 'react-router-dom'
import { AfterAct } from '../features/landowner/after-act'
import { AskChangeForm } from '../features/landowner/ask-change-form'
import { LandownerPage } from '../features/landowner/landowner-page'
import { MyPacket } from '../features/landowner/my-packet'
import { NotNow } from '../features/landowner/not-now'
import { offeredAct } from '../features/landowner/signing-steps'
import { WhileOffered } from '../features/landowner/while-offered'

export function AskChangePage() {
  const { t } = useTranslation()
  const { jobId = '' } = useParams()
  const [query] = useSearchParams()
  const [isAsked, setIsAsked] = useState(false)
  if (isAsked) {
    return (
      <LandownerPage key="asked" title={t('ask.done')}>
        <AfterAct jobId={jobId} sentence={t('ask.doneHow')} />
      </LandownerPage>
    )
  }
  return (
    <MyPacket>
      {(job, packet) => (
        <LandownerPage title={t('ask.title')}>
          <WhileOffered
            isOffered={packet !== null && offeredAct(job, 'ask-for-changes')?.enabled === true}
            otherwise={<NotNow job={job} title={t('job.cannotOpen')} />}
          >
            <AskChangeForm
              job={job}
              pages={packet?.pages ?? []}
              page={packet?.pages.find(({ number }) => String(number) === query.get('page'))?.number}
              onAsked={() => setIsAsked(true)}
            />
          </WhileOffered>
        </LandownerPage>
      )}
    </MyPacket>
  )
}
