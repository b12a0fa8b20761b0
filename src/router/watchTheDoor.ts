import { type RouteLocationNormalized, type Router } from 'vue-router'
import { whenSignedOut } from '@/api/call.ts'
import { useNoticesStore } from '@/stores/notices.ts'
import { useSessionStore } from '@/stores/session.ts'

/** Lets in who is signed in, shows everybody else the door, and brings eyes, readers and titles along to the new page. */
export function watchTheDoor(router: Router): void {
  router.beforeEach(async (to) => {
    const session = useSessionStore()
    const asked = session.wasIn || !to.meta.open ? session.load() : null
    if (session.wasIn || to.meta.open) fetchAhead(to)
    await asked
    if (to.meta.open) return session.me && to.path === '/sign-in' ? '/' : true
    if (session.away) return true
    return session.me ? true : { path: '/sign-in', query: to.fullPath === '/' ? {} : { next: to.fullPath } }
  })

  router.afterEach((to, from) => {
    document.title = to.meta.title ? `${to.meta.title} · Proofcloth` : 'Proofcloth'
    // A new page is read from its heading; the first one is read by the browser itself.
    if (from.matched.length && to.path !== from.path) requestAnimationFrame(focusHeading)
  })

  router.onError((_failure, to) => {
    // A page's script that is not there: a newer version has taken its place, or the line is down.
    const reloaded = 'proofcloth.reloaded'
    if (navigator.onLine && sessionStorage.getItem(reloaded) !== to.fullPath) {
      sessionStorage.setItem(reloaded, to.fullPath)
      window.location.assign(to.fullPath)
      return
    }
    useNoticesStore().show('The connection dropped. This page could not be opened.', { text: 'Try again', run: () => void router.push(to.fullPath) })
  })

  whenSignedOut(() => {
    const session = useSessionStore()
    if (!session.me) return // nobody was; the guard of the navigation under way leads to the door
    session.forget()
    const here = router.currentRoute.value
    if (!here.meta.open) void router.push({ path: '/sign-in', query: { next: here.fullPath } })
  })
}

/** Fetches a page's script while the server is still asked who is here, instead of after it. */
function fetchAhead(to: RouteLocationNormalized) {
  for (const { components } of to.matched) {
    const load = components?.default
    if (typeof load === 'function') void (load as () => Promise<unknown>)().catch(() => {}) // the router itself tells when it fails
  }
}

/** The heading of the new page, or its frame while the page is still being read. */
function focusHeading() {
  const heading = document.querySelector<HTMLElement>('h1')
  heading?.setAttribute('tabindex', '-1')
  ;(heading ?? document.getElementById('content'))?.focus({ preventScroll: true })
}
