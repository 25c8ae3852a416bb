import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { JobView, PacketView } from 'shared'
import { Section } from '../components/layout/section'
import { AfterAct } from '../features/landowner/after-act'
import { ConsentForm } from '../features/landowner/consent-form'
import { LandownerPage } from '../features/landowner/landowner-page'
import { MyPacket } from '../features/landowner/my-packet'
import { NotNow } from '../features/landowner/not-now'
import { useSharedWords } from '../features/landowner/shared-sentences'
import { SignForm } from '../features/landowner/sign-form'
import { signingSteps } from '../features/landowner/signing-steps'
import { StepsList } from '../features/landowner/steps-list'
import { WhatIsSigned } from '../features/landowner/what-is-signed'
import { WhileOffered } from '../features/landowner/while-offered'

export function SignPage() {
  const { t } = useTranslation()
  const words = useSharedWords()
  const [signed, setSigned] = useState<JobView | null>(null)
  if (signed !== null) {
    const next = signed.state === 'with-landowner' ? t('sign.doneOthers') : t('sign.doneHow')
    return (
      <LandownerPage title={t('sign.done')}>
        <AfterAct jobId={signed.id} sentence={next} />
      </LandownerPage>
    )
  }
  return (
    <MyPacket>
      {(job, packet) => {
        const steps = packet && signingSteps(job, packet)
        const why = steps?.otherReasons.map(words).join(' ') || undefined
        return (
          <WhileOffered
            isOffered={steps?.isMyTurn ?? false}
            otherwise={
              <LandownerPage title={t('sign.notNow')}>
                <NotNow job={job} title={t('job.cannotOpen')} sentence={why} />
              </LandownerPage>
            }
          >
            {packet && <ToSign job={job} packet={packet} onSigned={setSigned} />}
          </WhileOffered>
        )
      }}
    </MyPacket>
  )
}

interface ToSignProps {
  job: JobView
  packet: PacketView
  onSigned: (job: JobView) => void
}

function ToSign({ job, packet, onSigned }: ToSignProps) {
  const { t } = useTranslation()
  return (
    <LandownerPage title={t('sign.title', { revision: packet.revision })}>
      <WhatIsSigned job={job} packet={packet} />
      <Section title={t('job.steps')}>
        <StepsList jobId={job.id} steps={signingSteps(job, packet)} />
      </Section>
      {!packet.iHaveConsented && <ConsentForm packetId={packet.id} />}
      <SignForm job={job} packet={packet} onSigned={onSigned} />
    </LandownerPage>
  )
}
