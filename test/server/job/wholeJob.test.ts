import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs'
import { hangSkirt, photograph, seen, sizeAndTrace } from '../../support/job.ts'
import { type TestApp, testApp } from '../../support/testApp.ts'

// One skirt from its measurements to the cleared cut, through the API as the client uses it.
describe('a skirt from hanging to the final cut', () => {
  let app: TestApp
  let projectId = ''
  let base = ''
  let tightId = ''
  beforeAll(async () => {
    app = await testApp()
    projectId = await hangSkirt(app.maker, app)
    base = `/api/projects/${projectId}`
  })
  afterAll(() => app.close())

  const samples = (n: number) => `${base}/samples/${n}`

  it('refuses the first sample while no size is kept, and says so', async () => {
    const { body } = await app.maker.post(`${base}/samples`).send({}).expect(409)
    expect(body.error.message).toContain('Keep a size first')
  })

  it('refuses the last look while marks are missing, naming the pieces', async () => {
    const { body: plan } = await app.maker.get(`${base}/size-plan`).expect(200)
    await app.maker.put(`${base}/size-plan`).send({ choices: { waist: '14', hip: '16' }, keep: true, version: plan.version }).expect(200)
    await app.maker.post(`${base}/pieces/from-template`).expect(201)
    const { body } = await app.maker.post(`${base}/pieces/last-look`).expect(409)
    expect(body.error.message).toMatch(/Front.*Back/s)
    await app.maker.get(`${base}/pieces`).expect(200).then(async ({ body: { pieces } }) => {
      for (const { id } of pieces) await app.maker.delete(`${base}/pieces/${id}`).expect(204)
    })
  })

  it('writes the size of each piece from the plan, blended where it blends', async () => {
    await sizeAndTrace(app.maker, projectId)
    const { body } = await app.maker.get(`${base}/pieces`).expect(200)
    expect(body.ready).toBe(true)
    expect(body.pieces.find((piece: { role: string }) => piece.role === 'skirt-front').sizeLabel).toMatch(/14.*16/)
    expect(body.pieces.find((piece: { role: string }) => piece.role === 'waistband').sizeLabel).toBe('14')
  })

  it('reads one sample with its photograph, its mark and a suggestion', async () => {
    await app.maker.post(`${base}/samples`).send({ cloth: 'calico' }).expect(201)
    const { body: photo } = await app.maker.post(`${samples(1)}/photographs`).field('view', 'front').attach('photograph', await photograph(), 'front.jpg').expect(201)
    const { body: tight } = await app.maker.post(`${samples(1)}/observations`).send(seen({
      photographId: photo.id, mark: { kind: 'tight', shape: 'stroke', points: [[0.3, 0.5], [0.7, 0.5]] }, sign: 'tight', zone: 'hip', line: 'side-seam', amount: { mm: 40, as: 'cloth' },
    })).expect(201)
    tightId = tight.id
    expect(tight).toMatchObject({ number: 1, state: 'noted', sampleNumber: 1 })
    const { body: fitting } = await app.maker.get(samples(1)).expect(200)
    // common practice: side seams strain at the hip, 40 short all round → 10 on each of the four side-seam edges
    const [finding] = fitting.diagnosis.findings
    expect(finding.cause).toBe('hip-tight')
    expect(finding.change.amountMm).toBe(40)
    const hipEdges = finding.change.steps.filter((step: { edge: string; amountMm: number }) => step.edge.includes('side') && step.amountMm)
    expect(hipEdges.map((step: { amountMm: number; edges: number }) => [step.amountMm, step.edges])).toEqual([[10, 2], [10, 2]])
  })

  it('marks an observation as answered when its suggestion is accepted, and as noted again when that is taken back', async () => {
    const decide = { cause: 'hip-tight', side: 'both', decision: 'accepted' }
    const { body: change } = await app.fitter.post(`${samples(1)}/changes`).send(decide).expect(201)
    expect((await app.maker.get(samples(1))).body.observations[0].state).toBe('chosen')
    await app.maker.delete(`${base}/changes/${change.id}`).expect(204)
    expect((await app.maker.get(samples(1))).body.observations[0].state).toBe('noted')
    const { body: altered } = await app.maker.post(`${samples(1)}/changes`).send({ ...decide, decision: 'altered', amountMm: 20, note: 'half of it first' }).expect(201)
    expect(altered).toMatchObject({ decision: 'altered', suggestedMm: 40, amountMm: 20 })
    expect(altered.paper.steps.filter((step: { amountMm: number }) => step.amountMm).reduce((sum: number, step: { amountMm: number; edges: number }) => sum + step.amountMm * step.edges, 0)).toBe(20)
  })

  it('carries the change into sample 2 and asks the observation again with its prediction', async () => {
    for (const state of ['to-photograph', 'with-fitter', 'reviewed']) {
      const { body } = await app.maker.get(samples(1))
      await app.maker.patch(samples(1)).send({ state, version: body.sample.version }).expect(200)
    }
    await app.maker.post(`${base}/samples`).send({}).expect(201)
    const { body: second } = await app.maker.get(samples(2)).expect(200)
    expect(second.carriedIn).toHaveLength(1)
    expect(second.observations[0]).toMatchObject({ id: tightId, state: 'carried', predicted: { sampleNumber: 2, expectedMm: 20 } })
    expect((await app.maker.get(samples(1))).body.sample.state).toBe('closed')
  })

  it('learns the response and sizes the next change by it', async () => {
    const { body: read } = await app.fitter.put(`${samples(2)}/readings/${tightId}`).send({ gone: false, amount: { mm: 26, as: 'cloth' } }).expect(200)
    expect(read.readings[0]).toMatchObject({ outcome: 'better', sampleNumber: 2 })
    const { body } = await app.maker.get(samples(2)).expect(200)
    const [finding] = body.diagnosis.findings
    // 14 of the 20 that were put in reached the body: response 0.7; 26 / 0.7 ≈ 37
    expect(finding.response.value).toBeCloseTo(0.7, 2)
    expect(finding.change.amountMm).toBe(37)
    await app.maker.post(`${samples(2)}/changes`).send({ cause: 'hip-tight', side: 'both', decision: 'accepted' }).expect(201)
  })

  it('adds up in the ledger, piece by piece', async () => {
    const { body } = await app.maker.get(`${base}/ledger`).expect(200)
    const front = body.pieces.find(({ pieceRole }: { pieceRole: string }) => pieceRole === 'skirt-front')
    const sideSeam = front.lines.filter(({ edge }: { edge: string }) => edge.includes('side'))
    // 20 / 4 = 5 on both edges of the front, then 37 over four edges: 9 each and the odd millimetre on one of them
    const total = (side: string) => front.totals.filter((line: { edge: string, side: string }) => line.edge.includes('side') && [side, 'both'].includes(line.side))
      .reduce((sum: number, { amountMm }: { amountMm: number }) => sum + amountMm, 0)
    expect([total('right'), total('left')].sort()).toEqual([14, 15])
    expect(new Set(sideSeam.map(({ sampleNumber }: { sampleNumber: number }) => sampleNumber))).toEqual(new Set([1, 2]))
  })

  it('keeps the final cut shut and says why, until everything is settled and drawn', async () => {
    for (const state of ['to-photograph', 'reviewed']) {
      const { body } = await app.maker.get(samples(2))
      await app.maker.patch(samples(2)).send({ state, version: body.sample.version }).expect(200)
    }
    await app.maker.post(`${base}/samples`).send({}).expect(201)
    const { body: shut } = await app.maker.get(`${base}/final-cut`).expect(200)
    expect(shut.open).toBe(false)
    expect(shut.beforeTheCut.join(' ')).toMatch(/Observation 1 is still open.*is not drawn on/s)
    await app.maker.post(`${base}/final-cut/clear`).expect(409)

    await app.maker.put(`${samples(3)}/readings/${tightId}`).send({ gone: true, amount: null }).expect(200)
    for (const state of ['to-photograph', 'reviewed']) {
      const { body } = await app.maker.get(samples(3))
      await app.maker.patch(samples(3)).send({ state, version: body.sample.version }).expect(200)
    }
    const { body: { pieces } } = await app.maker.get(`${base}/pieces`)
    for (const piece of pieces) for (const change of piece.changes) await app.maker.put(`${base}/pieces/${piece.id}/transfers/${change.changeId}`).send({ transferred: true }).expect(200)
    expect((await app.maker.get(`${base}/final-cut`)).body.open).toBe(true)
  })

  it('is cleared when every line is ticked, and then only read', async () => {
    await app.fitter.put(`${base}/final-cut/agreement`).send({ agreed: true }).expect(200)
    const { body: list } = await app.maker.get(`${base}/final-cut`)
    const mine = list.items.filter(({ verified, ticked }: { verified: boolean; ticked: boolean }) => !verified && !ticked)
    await app.maker.patch(`${base}/final-cut`).send({ ticks: Object.fromEntries(mine.map(({ id }: { id: string }) => [id, true])), version: list.version }).expect(200)
    const { body: cleared } = await app.maker.post(`${base}/final-cut/clear`).expect(200)
    expect(cleared.clearedAt).toBeTruthy()
    await app.maker.post(`${samples(3)}/observations`).send(seen({})).expect(409)
    expect((await app.maker.get(`/api/studios/${app.studioId}/projects`)).body.projects[0]).toMatchObject({ stage: 'cleared', progress: 1 })
  })

  it('prints the cutting sheet on the paper that was asked for, with every piece and the test square', async () => {
    const { body } = await app.maker.get(`${base}/cutting-sheet.pdf?paper=letter&units=inch`).buffer(true).parse((res, done) => {
      const parts: Buffer[] = []
      res.on('data', (part: Buffer) => parts.push(part)).on('end', () => done(null, Buffer.concat(parts)))
    }).expect(200).expect('Content-Type', 'application/pdf')
    const pdf = await getDocument({ data: new Uint8Array(body), verbosity: 0 }).promise
    const page = await pdf.getPage(1)
    expect(page.view).toEqual([0, 0, 612, 792]) // US Letter, 8.5 × 11 in at 72 points an inch
    const text = (await page.getTextContent()).items.map((item) => ('str' in item ? item.str : '')).join(' ')
    expect(text).toMatch(/Brown skirt.*Measure me: 2 in each way.*1 Front.*2 Back.*3 Waistband/s)
  })
})
