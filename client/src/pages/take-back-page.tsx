import { ReasonPage } from '../features/landowner/reason-page'

export function TakeBackPage() {
  return <ReasonPage words="takeBack" />
}
