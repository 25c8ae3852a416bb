import { ReasonPage } from '../features/landowner/reason-page'

export function MyWithdrawPage() {
  return <ReasonPage words="withdraw" />
}
