import { createRouter, createWebHistory } from 'vue-router'
import RailView from '@/views/RailView.vue'
import { watchTheDoor } from './watchTheDoor.ts'

declare module 'vue-router' {
  interface RouteMeta {
    /** without header and bars */
    bare?: boolean
    /** open to people who are not signed in */
    open?: boolean
    /** the page has a dock of its own at the foot of the phone */
    dock?: boolean
    title?: string
  }
}

const sampleProps = (route: { params: Record<string, string | string[]> }) => ({ id: String(route.params.id), n: Number(route.params.n), cid: route.params.cid && String(route.params.cid) })

export const router = createRouter({
  history: createWebHistory(),
  // A filter in the address is the same page; the first page stands at its top already.
  scrollBehavior: (to, from, saved) => saved ?? (from.matched.length && to.path !== from.path ? { top: 0 } : false),
  routes: [
    // The rail comes with the first script: it is where nearly every visit begins, and a script of its own would be one more wait.
    { path: '/', component: RailView, meta: { title: 'On the rail' } },
    { path: '/new', component: () => import('@/views/NewGarmentView.vue'), meta: { title: 'Hang a new garment' } },
    { path: '/people', component: () => import('@/views/PeopleView.vue'), meta: { title: 'People' } },
    { path: '/people/:id/measurements', component: () => import('@/views/WearerView.vue'), props: true, meta: { title: 'Measurements' } },
    { path: '/patterns', component: () => import('@/views/PatternsView.vue'), meta: { title: 'Patterns' } },
    { path: '/patterns/:id', component: () => import('@/views/PatternView.vue'), props: true, meta: { title: 'Pattern' } },
    { path: '/studio', component: () => import('@/views/StudioView.vue'), meta: { title: 'Studio' } },
    { path: '/account', component: () => import('@/views/AccountView.vue'), meta: { title: 'Account' } },
    { path: '/p/:id', component: () => import('@/views/OverviewView.vue'), props: true, meta: { title: 'Overview' } },
    { path: '/p/:id/size', component: () => import('@/views/SizeView.vue'), props: true, meta: { title: 'Size' } },
    { path: '/p/:id/pieces', component: () => import('@/views/PiecesView.vue'), props: true, meta: { title: 'Pieces' } },
    { path: '/p/:id/samples/:n(\\d+)', component: () => import('@/views/SampleView.vue'), props: sampleProps, meta: { title: 'Fitting', dock: true } },
    { path: '/p/:id/samples/:n(\\d+)/changes/:cid', component: () => import('@/views/ChangeView.vue'), props: sampleProps, meta: { title: 'Change', dock: true } },
    { path: '/p/:id/compare', component: () => import('@/views/CompareView.vue'), props: true, meta: { title: 'Compare' } },
    { path: '/p/:id/final-cut', component: () => import('@/views/FinalCutView.vue'), props: true, meta: { title: 'Final cut' } },
    { path: '/p/:id/story', component: () => import('@/views/StoryView.vue'), props: true, meta: { title: 'The story' } },
    { path: '/p/:id/print/cutting-sheet', component: () => import('@/views/CuttingSheetView.vue'), props: true, meta: { title: 'Cutting sheet', bare: true } },
    { path: '/sign-in', component: () => import('@/views/SignInView.vue'), meta: { bare: true, open: true, title: 'Sign in' } },
    { path: '/sign-up', component: () => import('@/views/SignUpView.vue'), meta: { bare: true, open: true, title: 'Make an account' } },
    { path: '/reset', component: () => import('@/views/ResetRequestView.vue'), meta: { bare: true, open: true, title: 'A new password' } },
    // The token of the link stands behind the #, where no server and no log sees it.
    { path: '/reset-password', component: () => import('@/views/ResetView.vue'), props: (route) => ({ token: route.hash.slice(1) }), meta: { bare: true, open: true, title: 'A new password' } },
    { path: '/reset/:token', redirect: ({ params }) => ({ path: '/reset-password', hash: `#${String(params.token)}` }) },
    { path: '/:rest(.*)*', component: () => import('@/views/NotFoundView.vue'), meta: { title: 'Nothing here' } },
  ],
})

watchTheDoor(router)
