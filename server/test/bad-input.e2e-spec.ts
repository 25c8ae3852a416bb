import type { DesignView, ExampleJob, SurveyInput } from 'shared'
import { readExample } from './support/example'
import { expectProblem, pointersOf } from './support/expect-problem'
import { makeReadyDistrict, type ReadyDistrict } from './support/ready-district'
import { drawStandIns } from './support/stand-in-renderer'
import { startTestApp, type TestApp } from './support/test-app'
import { Walk, type Walked } from './support/walk'

let app: TestApp
let district: ReadyDistrict
let walk: Walk
let walked: Walked

const { job: example, survey } = readExample('north-pond')
const { plan } = example

beforeAll(async () => {
  app = await startTestApp()
  drawStandIns(app)
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
  walk = new Walk(app, district)
  walked = await walk.draft()
})
afterAll(() => app.stop())

/** The plan with one part of it changed to what no form would send. */
const planWith = (part: keyof ExampleJob['plan'], change: object): object => ({
  ...plan,
  [part]: { ...(plan[part] as object), ...change },
})

const readDesign = async (id = walked.designId): Promise<DesignView> =>
  (await district.planner.api.get(`/designs/${id}`).expect(200)).body

describe('a design with figures that cannot be', () => {
  const layer = plan.rock?.layers[0]
  const impossible: [name: string, plan: object, pointers: string[]][] = [
    ['a word for a number', planWith('ramp', { widthFt: 'NaN' }), ['/plan/ramp/widthFt']],
    ['a number as text', planWith('ramp', { widthFt: '18' }), ['/plan/ramp/widthFt']],
    ['nothing for a number', planWith('ramp', { widthFt: null }), ['/plan/ramp/widthFt']],
    ['a negative width', planWith('ramp', { widthFt: -18 }), ['/plan/ramp/widthFt']],
    ['a grade of nothing', planWith('ramp', { gradeRunPerRise: 0 }), ['/plan/ramp/gradeRunPerRise']],
    ['half an animal', planWith('herd', { headCount: 74.5 }), ['/plan/herd/headCount']],
    [
      'a number beyond all numbers',
      planWith('pads', { approach: { lengthFt: 1e308 } }),
      expect.arrayContaining(['/plan/pads/approach/lengthFt']),
    ],
    [
      'two impossible layers',
      planWith('rock', {
        layers: [
          { ...layer, thicknessIn: 0 },
          { ...layer, role: 'middle' },
        ],
      }),
      ['/plan/rock/layers/0/thicknessIn', '/plan/rock/layers/1/role'],
    ],
    ['a field nobody knows', planWith('ramp', { steepness: 4 }), ['/plan/ramp/steepness']],
    ['a part nobody knows', { ...plan, bridge: {} }, ['/plan/bridge']],
    ['a version of tomorrow', { ...plan, inputVersion: 2 }, ['/plan/inputVersion']],
  ]

  it.each(impossible)(
    'is refused beside the field, and the one before stays: %s',
    async (_name, wrong, pointers) => {
      const before = await readDesign()
      const { api } = district.planner
      const draft = { name: before.name, plan: wrong }
      const saved = await api.put(`/designs/${before.id}`, draft, { version: before.version })
      const made = await api.post(`/jobs/${walked.job.id}/designs`, draft)
      for (const answer of [saved, made])
        expect(pointersOf(expectProblem(answer, 'invalid-fields'))).toEqual(pointers)
      expect(await readDesign()).toEqual(before)
    },
  )

  it('is never taken at its word for results: they are unknown fields', async () => {
    const before = await readDesign()
    const { name, version, result } = before
    const posted = { name, plan, result, landownerShare: '0.00' }
    const answer = await district.planner.api.put(`/designs/${before.id}`, posted, { version })
    expect(pointersOf(expectProblem(answer, 'invalid-fields'))).toEqual(['/result', '/landownerShare'])
    const inside = { name, plan: { ...plan, result } }
    const again = await district.planner.api.put(`/designs/${before.id}`, inside, { version })
    expect(pointersOf(expectProblem(again, 'invalid-fields'))).toEqual(['/plan/result'])
    expect(await readDesign()).toEqual(before)
  })

  it('says in each message what would be right', async () => {
    const wrong = planWith('ramp', { widthFt: -1, gradeRunPerRise: 'steep' })
    const answer = await district.planner.api.post(`/jobs/${walked.job.id}/calculate`, wrong)
    expect(expectProblem(answer, 'invalid-fields').fields).toEqual([
      { pointer: '/ramp/widthFt', message: 'Must be at least 4 ft' },
      { pointer: '/ramp/gradeRunPerRise', message: 'Give a number from 2 to 40 run per rise' },
    ])
  })
})

describe('a ground line that never reaches the top of the ramp', () => {
  it('is kept and worked out as far as it goes, says so in a sentence, and makes no packet', async () => {
    const { job, designId } = await walk.draft('low.bank@farms.example')
    const { api } = district.planner
    const points = [
      { stationFt: 0, elevationFt: 100.2 },
      { stationFt: 60, elevationFt: 97.4 },
      { stationFt: 120, elevationFt: 93 },
    ]
    const low: SurveyInput = { kind: 'ground-line', points }
    await api.put(`/jobs/${job.id}/survey`, low, { version: 1 }).expect(200)
    const { version, name, result } = await readDesign(designId)
    expect(result.herd.ok).toBe(true)
    expect(result.profile).toEqual({
      ok: false,
      field: expect.any(String),
      message: expect.stringMatching(/^[A-Z].*\.$/),
    })
    const changed = { name: `${name}, lower`, plan }
    await api.put(`/designs/${designId}`, changed, { version }).expect(200)
    const problem = expectProblem(await api.act(`/jobs/${job.id}/packets`, { designId }), 'design-incomplete')
    const sentence = result.profile.ok || !('message' in result.profile) ? '' : result.profile.message
    expect(problem.detail).toContain(sentence)
    expect((await readDesign(designId)).name).toBe('First design, lower')
    expect((await walk.read(job.id)).revisions).toEqual([])
  })
})

describe('a job without survey or design', () => {
  it('makes no packet, and says what is missing', async () => {
    const { api } = district.planner
    const { body: producer } = await api.post('/producers', example.producer).expect(201)
    const job = (await api.post('/jobs', { ...example.job, producerIds: [producer.id] }).expect(201)).body
    const draft = { name: 'On no ground', plan: { inputVersion: 1 } }
    const design = (await api.post(`/jobs/${job.id}/designs`, draft).expect(201)).body
    const answer = await api.act(`/jobs/${job.id}/packets`, { designId: design.id })
    expect(pointersOf(expectProblem(answer, 'design-incomplete'))).toEqual(['/survey'])
    await api.put(`/jobs/${job.id}/survey`, survey, { version: 0 }).expect(200)
    const { fields } = expectProblem(
      await api.act(`/jobs/${job.id}/packets`, { designId: design.id }),
      'design-incomplete',
    )
    expect(fields?.length).toBeGreaterThan(3)
    for (const { message } of fields ?? []) expect(message).toMatch(/\.$/)
  })
})

describe('a file of level notes', () => {
  const read = (content: Buffer | string) =>
    district.planner.api.upload('/surveys/read-csv', 'notes.csv', content)
  const png = Buffer.from('iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk', 'base64')

  it.each([
    ['a letter', 'Dear office,\nhere are the notes.', 'is not a column'],
    ['a picture', png, 'not a text file'],
    ['nothing but a header', 'label,station,bs,is,fs\n', 'no rows under them'],
    [
      'a file with a wrong column',
      'label,station,bs,is,fs,colour\nBM,,4.86,,,red',
      '"colour" is not a column',
    ],
    ['a file without a needed column', 'label,station\nBM,0+00', 'is missing'],
    [
      'a quotation mark left open',
      'label,station,bs,is,fs\n"BM,,4.86,,',
      'quotation mark that is not closed',
    ],
    ['nothing', '', 'The file is empty.'],
    ['blank lines', '\n\n \n', 'The file is empty.'],
  ])('that is %s is refused as a whole, with what is wrong', async (_name, content, words) => {
    const problem = expectProblem(await read(content), 'unreadable-file')
    expect(problem.detail).toContain(words)
    expect(pointersOf(problem)).toEqual(['/file'])
  })

  it('with wrong cells comes back with the rows that are right and a fault beside each that is not', async () => {
    const text =
      'label,station,bs,is,fs\nBM-1,,4.86,,\n0+00,0+00,,high,\n0+20,twenty,,6.46,\n0+35,0+35,,6.96,\nBM-1,,,,4.9'
    const { body } = await read(text).expect(200)
    expect(body.errors).toEqual([
      expect.objectContaining({ row: 3, column: 'is' }),
      expect.objectContaining({ row: 4, column: 'station' }),
    ])
    expect(body.rows.map(({ label }: { label: string }) => label)).toEqual(
      expect.arrayContaining(['BM-1', '0+35']),
    )
  })

  it('as a spreadsheet in this country or another writes it is read', async () => {
    const rows = [
      { label: 'Ölbaum', backsightFt: 4.86 },
      { label: 'close', foresightFt: 4.86 },
    ]
    const plain = 'label;station;bs;is;fs\r\nÖlbaum;;4.86;;\r\nclose;;;;4.86\r\n'
    for (const content of [
      plain,
      `\uFEFF${plain}`,
      Buffer.from(plain, 'latin1'),
      plain.replaceAll(';', '\t'),
    ]) {
      expect((await read(content).expect(200)).body).toEqual({ rows, errors: [] })
    }
  })
})

describe('a survey', () => {
  it('that does not close is kept, with a remark that says by how much', async () => {
    if (survey.kind !== 'level-notes') throw new Error('The example has level notes.')
    const { job } = await walk.draft('misread@farms.example')
    const last = survey.rows.length - 1
    const rows = survey.rows.map((row, index) => (index === last ? { ...row, foresightFt: 4.86 } : row))
    const saved = await district.planner.api
      .put(`/jobs/${job.id}/survey`, { ...survey, rows }, { version: 1 })
      .expect(200)
    expect(saved.body.reduction).toMatchObject({ closes: false, misclosureFt: expect.closeTo(-0.49, 6) })
    expect(saved.body.remarks).toEqual([
      expect.stringMatching(/do not close: they miss the known elevation by 0\.490\sft/),
    ])
    expect(saved.body.survey.rows).toEqual(rows)
  })

  it.each([
    ['no rows', { rows: [] }, '/rows'],
    [
      'a reading higher than a rod',
      { rows: [{ label: 'BM', backsightFt: 600 }, { label: '0+00' }] },
      '/rows/0/backsightFt',
    ],
    ['an unknown kind', { kind: 'guess' }, '/kind'],
  ])('with %s is refused beside the field, and the one before stays', async (_name, change, pointer) => {
    const { api } = district.planner
    const before = (await api.get(`/jobs/${walked.job.id}/survey`)).body
    const answer = await api.put(
      `/jobs/${walked.job.id}/survey`,
      { ...survey, ...change },
      { version: before.version },
    )
    expect(pointersOf(expectProblem(answer, 'invalid-fields'))).toContain(pointer)
    expect((await api.get(`/jobs/${walked.job.id}/survey`)).body).toEqual(before)
  })
})
