import {
  createObservation, createOwnChange, decideChange, putAnswer, putReading, readFitting, removeObservation, removeReading, restoreObservation, startSample,
  takeBackChange, updateChange, updateObservation, updateSample,
} from '#shared/contracts/fitting.ts'
import { removePhotograph, restorePhotograph, updatePhotograph, uploadPhotograph } from '#shared/contracts/photograph.ts'
import { createComment, listComments } from '#shared/contracts/project.ts'
import { type RouteInput } from '#shared/contracts/route.ts'
import { call } from './call.ts'
import { upload } from './upload.ts'

type Body<R extends Parameters<typeof call>[0]> = RouteInput<R, 'body'>

/** Every request of a fitting for one project and sample. Creating requests take the key they may be repeated under. */
export function fittingApi(projectId: string, number: number) {
  const sampleParams = { projectId, number }
  const observation = (observationId: string) => ({ projectId, observationId })
  return {
    read: (signal?: AbortSignal) => call(readFitting, { params: sampleParams, signal }),
    updateSample: (body: Body<typeof updateSample>) => call(updateSample, { params: sampleParams, body }),
    startSample: (body: Body<typeof startSample>, idempotencyKey: string) => call(startSample, { params: { projectId }, body, idempotencyKey }),

    createObservation: (body: Body<typeof createObservation>, idempotencyKey: string) => call(createObservation, { params: sampleParams, body, idempotencyKey }),
    updateObservation: (id: string, body: Body<typeof updateObservation>) => call(updateObservation, { params: observation(id), body }),
    removeObservation: (id: string) => call(removeObservation, { params: observation(id) }),
    restoreObservation: (id: string) => call(restoreObservation, { params: observation(id) }),

    putReading: (observationId: string, body: Body<typeof putReading>) => call(putReading, { params: { ...sampleParams, observationId }, body }),
    removeReading: (observationId: string) => call(removeReading, { params: { ...sampleParams, observationId } }),
    putAnswer: (checkId: string, answer: 'yes' | 'no' | null) => call(putAnswer, { params: { ...sampleParams, checkId }, body: { answer } }),

    decide: (body: Body<typeof decideChange>, idempotencyKey: string) => call(decideChange, { params: sampleParams, body, idempotencyKey }),
    ownChange: (body: Body<typeof createOwnChange>, idempotencyKey: string) => call(createOwnChange, { params: sampleParams, body, idempotencyKey }),
    updateChange: (changeId: string, body: Body<typeof updateChange>) => call(updateChange, { params: { projectId, changeId }, body }),
    takeBack: (changeId: string) => call(takeBackChange, { params: { projectId, changeId } }),

    updatePhotograph: (photographId: string, body: Body<typeof updatePhotograph>) => call(updatePhotograph, { params: { projectId, photographId }, body }),
    removePhotograph: (photographId: string) => call(removePhotograph, { params: { projectId, photographId } }),
    restorePhotograph: (photographId: string) => call(restorePhotograph, { params: { projectId, photographId } }),
    uploadPhotograph: (file: File, body: Body<typeof uploadPhotograph>, options: { idempotencyKey: string; signal: AbortSignal; onProgress: (part: number) => void }) =>
      upload(uploadPhotograph, { params: sampleParams, body, file, ...options }),

    comments: () => call(listComments, { params: { projectId } }),
    comment: (text: string, idempotencyKey: string) => call(createComment, { params: { projectId }, body: { text, sampleNumber: number }, idempotencyKey }),
  }
}
export type FittingApi = ReturnType<typeof fittingApi>

export { photographUrl } from './photographUrl.ts'
