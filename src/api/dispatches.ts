import { z } from 'zod'
import type { Contact, ContactInput, Dispatch, DispatchInput } from '#shared/contracts/dispatch'
import { contact, dispatch } from '#shared/contracts/dispatch'
import { request } from './http'

export const listContacts = (projectId: string): Promise<Contact[]> =>
  request(z.array(contact), 'GET', `/api/projects/${projectId}/contacts`)

export const createContact = (projectId: string, input: ContactInput, idempotencyKey: string): Promise<Contact> =>
  request(contact, 'POST', `/api/projects/${projectId}/contacts`, { body: input, idempotencyKey })

export const listDispatches = (projectId: string): Promise<Dispatch[]> =>
  request(z.array(dispatch), 'GET', `/api/projects/${projectId}/dispatches`)

/** Dispatches addressed to the person who is signed in. */
export const listReceived = (): Promise<Dispatch[]> => request(z.array(dispatch), 'GET', '/api/dispatches')

export const createDispatch = (projectId: string, input: DispatchInput, idempotencyKey: string): Promise<Dispatch> =>
  request(dispatch, 'POST', `/api/projects/${projectId}/dispatches`, { body: input, idempotencyKey })

export const reportAddress = (dispatchId: string): string => `/api/dispatches/${dispatchId}/report.pdf`

/** The report as a page; the server puts it into a sandbox. */
export const reportPageAddress = (dispatchId: string): string => `/api/dispatches/${dispatchId}/report.html`
