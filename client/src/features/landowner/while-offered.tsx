import { useState, type ReactNode } from 'react'

interface WhileOfferedProps {
  isOffered: boolean
  otherwise: ReactNode
  children: ReactNode
}

/** A form that was offered stays while its act is under way: the job has moved on before its thanks are shown. */
export function WhileOffered({ isOffered, otherwise, children }: WhileOfferedProps) {
  const [wasOffered] = useState(isOffered)
  return <>{wasOffered || isOffered ? children : otherwise}</>
}
