import type { Role } from '#shared/contracts/person'
import type { RouteRecordRaw } from 'vue-router'
import { createRouter, createWebHistory } from 'vue-router'
import { sheetsFor } from '../components/project/projectSheets'
import { useSessionStore } from '../stores/session'
import { homeOf } from './homeOf'
import type { RouteName } from './routeName'

declare module 'vue-router' {
  interface RouteMeta {
    /** Open to somebody who is not signed in. */
    isOpen?: true
    /** Signed in with one of these roles; absent: any. */
    roles?: readonly Role[]
    title: string
  }
}

type NamedRoute = RouteRecordRaw & { name: RouteName; children?: NamedRoute[] }

const surveyor: readonly Role[] = ['surveyor']

const projectSheets: NamedRoute[] = [
  { path: 'brief', name: 'brief', component: () => import('../views/BriefView.vue'), meta: { title: 'Brief', roles: surveyor } },
  {
    path: 'levels',
    name: 'levels',
    component: () => import('../views/LevelsView.vue'),
    meta: { title: 'Levels', roles: surveyor },
  },
  {
    path: 'schemes',
    name: 'schemes',
    component: () => import('../views/SchemesView.vue'),
    meta: { title: 'Schemes', roles: surveyor },
  },
  {
    path: 'layout',
    name: 'layout',
    component: () => import('../views/LayoutView.vue'),
    meta: { title: 'Layout', roles: ['surveyor', 'engineer'] },
  },
  {
    path: 'bars',
    name: 'bars',
    component: () => import('../views/BarsView.vue'),
    meta: { title: 'Bars', roles: ['surveyor', 'engineer'] },
  },
  { path: 'scope', name: 'scope', component: () => import('../views/ScopeView.vue'), meta: { title: 'Scope', roles: surveyor } },
  {
    path: 'quantities',
    name: 'quantities',
    component: () => import('../views/QuantitiesView.vue'),
    meta: { title: 'Quantities', roles: surveyor },
  },
  { path: 'bill', name: 'bill', component: () => import('../views/BillView.vue'), meta: { title: 'Bill', roles: surveyor } },
  {
    path: 'compare',
    name: 'compare',
    component: () => import('../views/CompareView.vue'),
    meta: { title: 'Compare', roles: ['surveyor', 'developer'] },
  },
  {
    path: 'checks',
    name: 'checks',
    component: () => import('../views/ChecksView.vue'),
    meta: { title: 'Checks', roles: ['surveyor', 'engineer'] },
  },
  { path: 'sent', name: 'sent', component: () => import('../views/SentView.vue'), meta: { title: 'Sent', roles: surveyor } },
]

const routes: NamedRoute[] = [
  {
    path: '/sign-in',
    name: 'signIn',
    component: () => import('../views/SignInView.vue'),
    meta: { isOpen: true, title: 'Sign in' },
  },
  {
    path: '/reset',
    name: 'passwordReset',
    component: () => import('../views/PasswordResetView.vue'),
    meta: { isOpen: true, title: 'New password' },
  },
  {
    path: '/invitation',
    name: 'invitation',
    component: () => import('../views/InvitationView.vue'),
    meta: { isOpen: true, title: 'Invitation' },
  },
  {
    path: '/',
    name: 'projects',
    component: () => import('../views/ProjectsView.vue'),
    meta: { title: 'Projects', roles: ['surveyor', 'estimator', 'developer', 'engineer'] },
  },
  {
    path: '/projects/:projectId',
    name: 'project',
    props: true,
    component: () => import('../views/ProjectView.vue'),
    meta: { title: 'Project', roles: ['surveyor', 'developer', 'engineer'] },
    children: projectSheets,
  },
  {
    path: '/rates',
    name: 'rates',
    component: () => import('../views/RatesView.vue'),
    meta: { title: 'Rates', roles: ['surveyor', 'estimator'] },
  },
  {
    path: '/rates/:editionId/resources',
    name: 'resources',
    props: true,
    component: () => import('../views/ResourcesView.vue'),
    meta: { title: 'Resources', roles: ['surveyor', 'estimator'] },
  },
  {
    path: '/rates/:editionId/import',
    name: 'rateImport',
    props: true,
    component: () => import('../views/RateImportView.vue'),
    meta: { title: 'Price lists', roles: ['surveyor', 'estimator'] },
  },
  {
    path: '/blocks',
    name: 'blocks',
    component: () => import('../views/BlocksView.vue'),
    meta: { title: 'Blocks', roles: ['surveyor', 'estimator'] },
  },
  {
    path: '/people',
    name: 'people',
    component: () => import('../views/PeopleView.vue'),
    meta: { title: 'People', roles: ['admin'] },
  },
  {
    path: '/received',
    name: 'received',
    component: () => import('../views/ReceivedView.vue'),
    meta: { title: 'Received', roles: ['client'] },
  },
  {
    path: '/:pathMatch(.*)*',
    name: 'notFound',
    component: () => import('../views/NotFoundView.vue'),
    meta: { isOpen: true, title: 'No such sheet' },
  },
]

export const router = createRouter({
  history: createWebHistory(),
  routes,
  scrollBehavior: (to, from, saved) =>
    saved ?? (/^#[a-z]$/.test(to.hash) ? { el: to.hash } : to.path === from.path ? {} : { top: 0 }),
})

router.beforeEach(async (to) => {
  const store = useSessionStore()
  if (store.session === undefined) await store.load()
  if (to.meta.isOpen) return to.name === 'signIn' && store.session ? { name: homeOf(store.roles), replace: true } : true
  if (!store.session) return { name: 'signIn', query: to.fullPath === '/' ? {} : { next: to.fullPath } }
  const isAllowed = to.matched.every(({ meta }) => meta.roles?.some(store.hasRole) ?? true)
  if (to.name === 'project') return { name: sheetsFor(store.roles)[0]?.name ?? 'projects', params: to.params, replace: true }
  return isAllowed || { name: homeOf(store.roles), replace: true }
})

router.afterEach((to) => {
  document.title = `${to.meta.title} · Bothways`
})
