import { type Piece, confirmTracing, createPiece, listPieces, removePiece, setTransfer, startPieces, updatePiece } from '#shared/contracts/piece.ts'
import { type RouteInput, type RouteResponse } from '#shared/contracts/route.ts'
import { useQueryCache } from '@pinia/colada'
import { computed, ref, shallowRef } from 'vue'
import { ApiError, call } from '@/api/call.ts'
import { type SaveState } from '@/composables/useAutosave.ts'

type Change = Omit<RouteInput<typeof updatePiece, 'body'>, 'version'>
const wordsOf = (failure: unknown) => (failure instanceof Error ? failure.message : 'This did not reach the journal.')

/**
 * The tracing list of a project, saved tick by tick. A piece is shown as it was ticked at once; saves of one piece go one after the
 * other, and a tick somebody else made meanwhile is taken over, with one's own on top.
 */
export function useTracing(projectId: string) {
  const tracing = shallowRef<RouteResponse<typeof listPieces> | null>(null)
  const problem = ref('')
  const refused = ref('')
  const problems = shallowRef<ReadonlyMap<string, string>>(new Map())
  const pending = ref(0)
  const cache = useQueryCache()
  const params = { projectId }
  const state = computed<SaveState>(() => (problems.value.size ? 'failed' : pending.value ? 'saving' : 'saved'))

  const show = (next: RouteResponse<typeof listPieces>) => { tracing.value = next }
  const put = (piece: Piece) => {
    if (!tracing.value) return
    const pieces = tracing.value.pieces.map((one) => (one.id === piece.id ? piece : one))
    const ready = pieces.length > 0 && pieces.every(({ missing }) => !missing.length)
    tracing.value = { ...tracing.value, pieces, ready, lastLookAt: ready ? tracing.value.lastLookAt : null }
  }
  function say(pieceId: string, message: string) {
    const map = new Map(problems.value)
    if (message) map.set(pieceId, message)
    else map.delete(pieceId)
    problems.value = map
  }
  async function load() {
    problem.value = ''
    try {
      show(await call(listPieces, { params }))
    } catch (failure) {
      problem.value = wordsOf(failure)
    }
  }

  const queues = new Map<string, Promise<void>>()
  /** Runs a piece's saves one after the other. */
  const inTurn = (pieceId: string, work: () => Promise<void>) => {
    pending.value++
    const run = (queues.get(pieceId) ?? Promise.resolve()).then(work).finally(() => { pending.value-- })
    queues.set(pieceId, run)
    return run
  }
  const find = (pieceId: string) => tracing.value?.pieces.find(({ id }) => id === pieceId)
  function change(pieceId: string, part: Change) {
    const now = find(pieceId)
    if (!now) return
    put({ ...now, ...part, marks: { ...now.marks, ...part.marks } } as Piece)
    void inTurn(pieceId, async () => {
      try {
        put(await call(updatePiece, { params: { ...params, pieceId }, body: { ...part, version: find(pieceId)!.version } }))
        say(pieceId, '')
      } catch (failure) {
        if (failure instanceof ApiError && failure.code === 'version.stale') {
          const theirs = failure.details.theirs as Piece
          put(await call(updatePiece, { params: { ...params, pieceId }, body: { ...part, version: theirs.version } }))
          say(pieceId, '')
        } else {
          say(pieceId, `${wordsOf(failure)} It is still ticked here; change it once more to save it.`)
        }
      }
    })
  }
  const transfer = (pieceId: string, changeId: string, transferred: boolean) => inTurn(pieceId, async () => {
    try {
      put(await call(setTransfer, { params: { ...params, pieceId, changeId }, body: { transferred } }))
      say(pieceId, '')
      await cache.invalidateQueries({ key: ['project', projectId] })
    } catch (failure) {
      say(pieceId, wordsOf(failure))
    }
  })
  /** Runs something that changes the list; a refusal is kept in words. */
  async function act<T>(work: () => Promise<T>): Promise<T | null> {
    refused.value = ''
    try {
      const done = await work()
      await cache.invalidateQueries({ key: ['project', projectId] })
      return done
    } catch (failure) {
      refused.value = wordsOf(failure)
      return null
    }
  }
  return {
    tracing, problem, refused, problems, state, load, change, transfer,
    start: () => act(async () => show(await call(startPieces, { params }))),
    lastLook: () => act(async () => { show(await call(confirmTracing, { params })); return true }),
    add: (input: RouteInput<typeof createPiece, 'body'>, key: string) => act(async () => { await call(createPiece, { params, body: input, idempotencyKey: key }); await load(); return true }),
    remove: (pieceId: string) => act(async () => { await call(removePiece, { params: { ...params, pieceId } }); await load(); return true }),
  }
}
