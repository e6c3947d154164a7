import type { Brief, Level, Scheme } from '../../contracts/appraisal'
import type { Check } from '../../contracts/appraisalResult'

/** A floor and one way of building it: what a cure changes. */
export interface CureInput {
  readonly scheme: Scheme
  readonly brief: Brief
  readonly levels: readonly Level[]
}

/** One check of one panel: its row in the panel's own list of checks, from 0. */
export interface CheckTarget {
  readonly level: string
  readonly panel: string
  readonly index: number
}

/** A check as it stands after a change, or before. */
export interface CheckName {
  readonly name: Check['name']
  readonly place: string
}

/** One change, everything else left as it is, with which a failing check passes. Plain data. */
export interface Cure {
  /** 'thickness 265 mm instead of 250 mm' */
  readonly change: string
  /** The check after it: '402 ≥ 377 mm²' where it is of a minimum, '31.2 ≤ 34.5' where it is of a maximum. */
  readonly result: string
  readonly scheme: Scheme
  readonly brief: Brief
  /** Checks of the panel that passed before and fail after it. */
  readonly breaks: readonly CheckName[]
}

/** What was found for one failing check, and what was tried in vain: 'thickness up to 1500 mm'. */
export interface Cures {
  readonly cures: readonly Cure[]
  readonly inVain: readonly string[]
}

/** A changed scheme or brief that is tried, and how it is told. */
export interface Trial {
  readonly scheme: Scheme
  readonly brief: Brief
  readonly change: string
}

/** One thing that can be changed: trials from the smallest change to the greatest, and how its end is told. */
export interface Lever {
  readonly trials: readonly Trial[]
  /** Whether every trial is tried in turn, since a greater change need not do more; else a change that does is closed in on. */
  readonly isEvery: boolean
  readonly limit: string
}
