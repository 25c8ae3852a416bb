import type { JobAction } from './edges.js'

/** What the button says. */
export const actionWords: Record<JobAction, string> = {
  'send-to-landowner': 'Send to landowner',
  sign: 'Sign',
  'ask-for-changes': 'Ask for a change',
  'take-signature-back': 'Take my signature back',
  approve: 'Approve',
  return: 'Return with notes',
  send: 'Send the packet',
  'start-building': 'Start building',
  'finish-check-out': 'Finish check-out',
  certify: 'Certify',
  'return-to-building': 'Return to building',
  'record-final-payment': 'Record final payment',
  'put-in-service': 'Put in service',
  end: 'End the job',
  stop: 'Stop the job',
  withdraw: 'Withdraw',
}
