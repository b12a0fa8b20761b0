import { type Route, type RouteInput, type RouteResponse } from '#shared/contracts/route.ts'
import { ApiError, addressOf, readAnswer, readRefusal } from './call.ts'

export type UploadOptions<R extends Route> = {
  params: RouteInput<R, 'params'>
  /** the fields beside the file */
  body: RouteInput<R, 'body'>
  file: File
  idempotencyKey: string
  signal?: AbortSignal
  /** part of the bytes that left this device, 0..1 */
  onProgress?: (part: number) => void
}

/**
 * Sends one file to an upload route. XMLHttpRequest, because fetch cannot tell how far an upload is.
 * @throws ApiError with the server's sentence; `network` with how far it got when the connection dropped
 */
export function upload<const R extends Route>(route: R, { params, body, file, idempotencyKey, signal, onProgress }: UploadOptions<R>): Promise<RouteResponse<R>> {
  return new Promise((resolve, reject) => {
    const form = new FormData()
    for (const [name, value] of Object.entries(body as object)) if (value !== undefined && value !== null) form.append(name, String(value))
    form.append('photograph', file, file.name)
    const request = new XMLHttpRequest()
    let sent = 0
    request.open(route.method.toUpperCase(), addressOf(route, { ...(params as object) }))
    request.setRequestHeader('Accept', 'application/json')
    request.setRequestHeader('Idempotency-Key', idempotencyKey)
    request.upload.onprogress = ({ loaded, total }) => { sent = total ? loaded / total : 0; onProgress?.(sent) }
    request.onload = () => {
      const answer: unknown = (() => { try { return JSON.parse(request.responseText) } catch { return null } })()
      try {
        if (request.status < 200 || request.status >= 300) throw readRefusal(request.status, answer, request.getResponseHeader('Retry-After'))
        resolve(readAnswer(route, request.status, answer))
      } catch (failure) {
        reject(failure)
      }
    }
    request.onerror = () => reject(new ApiError(0, 'network', `The connection dropped at ${Math.round(sent * 100)} %. The photograph is still on this device; send it again.`))
    request.onabort = () => reject(new DOMException('Cancelled', 'AbortError'))
    signal?.addEventListener('abort', () => request.abort(), { once: true })
    if (signal?.aborted) request.abort()
    else request.send(form)
  })
}
