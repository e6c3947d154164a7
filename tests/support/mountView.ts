import { flushPromises, mount } from '@vue/test-utils'
import type { Pinia } from 'pinia'
import { createPinia, setActivePinia } from 'pinia'
import type { Component } from 'vue'
import { h } from 'vue'
import type { Router } from 'vue-router'
import { createMemoryHistory, createRouter, RouterView } from 'vue-router'

export interface Mounted {
  readonly router: Router
  readonly pinia: Pinia
  readonly unmount: () => void
}

const NAMES = [
  'signIn',
  'passwordReset',
  'invitation',
  'projects',
  'brief',
  'levels',
  'schemes',
  'layout',
  'bars',
  'scope',
  'quantities',
  'bill',
  'compare',
  'checks',
  'sent',
  'received',
  'people',
  'rates',
  'rateImport',
  'resources',
] as const

/** Mounts a view at an address, in the document, with a router that knows every name and shows only this view. */
export async function mountView(
  view: Component,
  at = '/view',
  props: Record<string, unknown> = {},
  pinia = createPinia(),
): Promise<Mounted> {
  document.body.innerHTML = ''
  setActivePinia(pinia)
  const elsewhere = { render: () => h('p', 'elsewhere') }
  const router = createRouter({
    history: createMemoryHistory(),
    routes: [
      { path: '/view', component: view, props },
      { path: '/projects/:projectId', name: 'project', component: elsewhere },
      ...NAMES.map((name) => ({ path: `/${name}/:projectId?`, name, component: elsewhere })),
    ],
  })
  await router.push(at)
  const wrapper = mount({ render: () => h(RouterView) }, { attachTo: document.body, global: { plugins: [pinia, router] } })
  await flushPromises()
  return { router, pinia, unmount: () => wrapper.unmount() }
}
