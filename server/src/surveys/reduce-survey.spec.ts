import { Problem, type SurveyInput } from 'shared'
import { reduceSurvey } from './reduce-survey'
import { surveyProblem } from './survey-problem'
import { surveyRemarks } from './survey-remarks'

const notes = (closeFt: number): SurveyInput => ({
  kind: 'level-notes',
  startElevationFt: 104.2,
  rows: [
    { label: 'BM-1', backsightFt: 4.86 },
    { label: '0+20', stationFt: 20, intermediateFt: 6.46 },
    { label: '0+00', stationFt: 0, intermediateFt: 5.86 },
    { label: 'BM-1', foresightFt: closeFt },
  ],
  closing: { knownElevationFt: 104.2, minimumFt: 0.02 },
})

function refusalOf(survey: SurveyInput): Problem {
  try {
    reduceSurvey(survey)
  } catch (error) {
    const problem = surveyProblem(error, survey.kind)
    if (problem instanceof Problem) return problem
  }
  throw new Error('Nothing was refused.')
}

describe('a survey', () => {
  it('of level notes gives the ground line in order of station: HI less each sight', () => {
    expect(reduceSurvey(notes(4.86)).groundLine).toEqual([
      { stationFt: 0, elevationFt: 103.2 },
      { stationFt: 20, elevationFt: 102.6 },
    ])
  })

  it('of soundings lies the depth under the water surface', () => {
    const points = [
      { stationFt: 0, elevationFt: 100 },
      { stationFt: 9, waterDepthFt: 2 },
    ]
    const { groundLine, reduction } = reduceSurvey({ kind: 'ground-line', waterSurfaceFt: 98.6, points })
    expect(groundLine[1]?.elevationFt).toBeCloseTo(96.6, 9)
    expect(reduction).toBeNull()
  })

  it('that does not close is kept, and says by how much and what to do', () => {
    const [remark] = surveyRemarks(reduceSurvey(notes(4.81)).reduction)
    expect(remark).toMatch(/do not close.*0\.050.ft.*0\.020.ft is allowed.*run the line again/)
    expect(surveyRemarks(reduceSurvey(notes(4.86)).reduction)).toEqual([])
  })

  it('with a row that cannot be is refused beside that row', () => {
    const survey = notes(4.86)
    if (survey.kind !== 'level-notes') throw new Error('These are level notes.')
    const rows = [...survey.rows]
    rows[1] = { label: '0+20', stationFt: 20, intermediateFt: 6.46, foresightFt: 3 }
    const { slug, extras } = refusalOf({ ...survey, rows })
    expect(slug).toBe('invalid-fields')
    expect(extras.fields).toEqual([{ pointer: '/rows/1', message: expect.stringMatching(/^Row 2: /) }])
  })

  it('with stations that run back is refused beside the points', () => {
    const points = [
      { stationFt: 9, elevationFt: 100 },
      { stationFt: 0, elevationFt: 99 },
    ]
    expect(refusalOf({ kind: 'ground-line', points }).extras.fields?.[0]?.pointer).toBe('/points')
  })
})
