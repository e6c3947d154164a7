import { flushPromises } from '@vue/test-utils'
import { createPinia } from 'pinia'
import { vi } from 'vitest'
import type { Component } from 'vue'
import type { ItemCode } from '../../shared/contracts/appraisal'
import type { ProjectSheet } from '../../shared/contracts/project'
import { unitOf } from '../../shared/takeoff/measurementRules'
import { useProjectStore } from '../../src/stores/project'
import { useSessionStore } from '../../src/stores/session'
import { answeringWorkers } from './answeringWorker'
import { fakeApi } from './fakeApi'
import { mountView } from './mountView'
import { aSession, aSheet, projectId } from './projectSheetOf'

const RATES: Partial<Record<ItemCode, string>> = {
  'concrete.slab': '149.63',
  'blocks.whole': '0.98',
  'blocks.cut': '1.4',
  'blocks.closedEnds': '0.42',
  'steel.bar.8': '1620',
  'steel.bar.10': '1540',
  'steel.bar.12': '1486',
  'steel.bar.16': '1440',
  'steel.bar.20': '1440',
  'formwork.soffit': '21.4',
  'formwork.edge': '9.2',
  'curing.area': '0.62',
  'propping.area': '5.8',
}

/** A project on one panel whose every item has a rate, less those named. */
export function aPricedSheet(unpriced: readonly ItemCode[] = []): ProjectSheet {
  const sheet = aSheet(['P1'])
  const rates = Object.entries(RATES)
    .map(([item, likely]) => ({ item: item as ItemCode, likely }))
    .filter(({ item }) => !unpriced.includes(item))
    .map(({ item, likely }) => ({
      item,
      description: item,
      unit: unitOf(item),
      low: likely,
      likely,
      high: likely,
      source: 'agreed',
      sourceDate: null,
      buildUp: null,
      version: 1,
    }))
  return { ...sheet, edition: sheet.edition && { ...sheet.edition, rates } }
}

/**
 * Opens the project as a surveyor, appraised by the engine itself, and shows one of its sheets. Wants fake timers.
 * @param chosen - ids of the schemes that were chosen to be compared
 */
export async function openSheet(
  view: Component,
  sheet: ProjectSheet,
  answers: Parameters<typeof fakeApi>[0] = {},
  chosen?: { ribbed?: string; solid?: string },
) {
  sessionStorage.clear()
  if (chosen) sessionStorage.setItem('bothways.pair', JSON.stringify({ [projectId]: chosen }))
  answeringWorkers()
  const api = fakeApi({ [`GET /api/projects/${projectId}`]: () => ({ status: 200, json: sheet }), ...answers })
  const pinia = createPinia()
  useSessionStore(pinia).session = aSession('surveyor')
  const store = useProjectStore(pinia)
  await store.open(projectId)
  const { unmount, router } = await mountView(view, '/view', {}, pinia)
  const settle = async (ms = 150) => {
    await vi.advanceTimersByTimeAsync(ms)
    await flushPromises()
  }
  await settle()
  return { api, store, router, unmount, settle }
}
