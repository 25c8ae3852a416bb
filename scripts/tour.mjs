// npm run tour: one job from the bank to the mailed packet, against the running product, by its HTTP API alone.
import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { parseArgs } from 'node:util'
import { prepareDistrict } from './tour/administrator.mjs'
import { ApiSession } from './tour/api-session.mjs'
import { figuresOf } from './tour/figures.mjs'
import { Mailbox } from './tour/mailbox.mjs'
import { sendPacket } from './tour/office.mjs'
import { answerNotes, change, design, makePacket, openJob, sendToLandowner, survey } from './tour/planner.mjs'
import { readExample, withChange } from './tour/read-example.mjs'
import { approve, askForChange, checkPacket, comeByMail, returnWithNote, sign } from './tour/readers.mjs'
import { Record } from './tour/record.mjs'
import { runFolder } from './system/places.mjs'
import { giveUp } from './system/say.mjs'

const { values } = parseArgs({ options: { input: { type: 'string' }, notes: { type: 'string' } } })

function readRun(name) {
  const file = join(runFolder(), name)
  if (!existsSync(file))
    giveUp(`Wadestone is not running here: ${file} is missing. Start it with: npm start`, 2)
  return readFileSync(file, 'utf8')
}

/** One session for each person of the first district, the two planners apart. */
async function signInAll(address) {
  const signIns = JSON.parse(readRun('demo-sign-ins.json'))
  const { district } = signIns[0]
  const of = (role) => signIns.filter((each) => each.district === district && each.role === role)
  const [planner, checker] = of('planner')
  const people = {
    planner,
    checker,
    administrator: of('administrator')[0],
    supervisor: of('supervisor')[0],
    office: of('office')[0],
  }
  const sessions = {}
  for (const [name, signIn] of Object.entries(people)) {
    sessions[name] = new ApiSession(address)
    await sessions[name].signIn(signIn)
  }
  return sessions
}

async function tour() {
  const { example, notesName, notesText } = readExample(values)
  const address = readRun('address')
  const people = await signInAll(address)
  const record = new Record()
  const mailbox = new Mailbox(example.producer.email)
  const { planner, checker, supervisor } = people

  await prepareDistrict({ api: people.administrator, example, record })
  const job = await openJob({ api: planner, example, record })
  await survey({ api: planner, job, example, notesName, notesText, record })
  const { id: designId } = await design({ api: planner, job, plan: example.plan, record })

  const makeCheckAndSend = async () => {
    const { packet } = await makePacket({ api: planner, job, designId, record })
    await checkPacket({ api: checker, packet, record })
    await sendToLandowner({ api: planner, job, record })
    const landowner = new ApiSession(address)
    await comeByMail({ api: landowner, mailbox, record })
    return { packet, landowner }
  }

  const first = await makeCheckAndSend()
  await askForChange({ api: first.landowner, job, packet: first.packet, asks: example.landownerAsks, record })
  await answerNotes({ api: planner, job, text: example.plannerAnswersLandowner, record })
  const wished = withChange(example.plan, example.landownerAsks)
  await change({
    api: planner,
    designId,
    plan: wished,
    why: 'changes the design as the landowner asked',
    record,
  })

  const second = await makeCheckAndSend()
  await sign({ api: second.landowner, job, packet: second.packet, name: example.producer.name, record })
  await returnWithNote({ api: supervisor, job, asks: example.supervisorAsks, record })
  await answerNotes({ api: planner, job, text: example.plannerAnswersSupervisor, record })
  const final = withChange(wished, example.supervisorAsks)
  const saved = await change({
    api: planner,
    designId,
    plan: final,
    why: 'changes the design as the supervisor asked',
    record,
  })

  const third = await makeCheckAndSend()
  await sign({ api: third.landowner, job, packet: third.packet, name: example.producer.name, record })
  await approve({ api: supervisor, job, packet: third.packet, record })
  const packetB = await sendPacket({ api: people.office, job, mailbox, record })
  record.result({
    job: { id: job.id, number: job.number },
    figures: figuresOf(saved.result),
    pages: packetB.pages,
  })
  console.log(
    `\nThe whole job went as promised. Written: result.json, packet.pdf and mail.eml in ${record.folder}.`,
  )
}

try {
  await tour()
} catch (error) {
  giveUp(`\nNot as promised. ${error.message}`)
}
