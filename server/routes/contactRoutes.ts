import { contactInput } from '#shared/contracts/dispatch'
import { Router } from 'express'
import type { EntityManager } from 'typeorm'
import { parse } from '../errors'
import { creatingRequest } from '../middleware/creatingRequest'
import { idOf } from '../middleware/idOf'
import { whoOf } from '../middleware/signedInOnly'
import { createContact, listContacts } from '../services/dispatch/contactService'

/** Contacts of a project: those to whom comparisons may be sent. */
export function contactRoutes(db: EntityManager): Router {
  return Router()
    .get('/projects/:id/contacts', async (request, response) => {
      response.json(await listContacts(db, whoOf(response), idOf(request, 'id')))
    })
    .post('/projects/:id/contacts', async (request, response) => {
      const projectId = idOf(request, 'id')
      const input = parse(contactInput, request.body)
      response.status(201).json(await createContact(db, whoOf(response), projectId, input, creatingRequest(request, input)))
    })
}
