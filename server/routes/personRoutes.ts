import { invitationInput, personChange } from '#shared/contracts/person'
import { Router } from 'express'
import type { EntityManager } from 'typeorm'
import { z } from 'zod'
import { parse } from '../errors'
import { creatingRequest } from '../middleware/creatingRequest'
import { idOf } from '../middleware/idOf'
import { whoOf } from '../middleware/signedInOnly'
import { seenVersion, tellVersion } from '../middleware/version'
import { changePerson, invitePerson, listPeople, repeatInvitation } from '../services/person/personService'

/** People of the firm: for its admins. @param origin - configured address, for the links in mails */
export function personRoutes(db: EntityManager, origin: string): Router {
  return Router()
    .get('/people', async (_request, response) => {
      response.json(await listPeople(db, whoOf(response)))
    })
    .post('/people', async (request, response) => {
      const input = parse(invitationInput, request.body)
      const person = await invitePerson(db, whoOf(response), origin, input, creatingRequest(request, input))
      tellVersion(response, person.version)
      response.status(201).json(person)
    })
    .put('/people/:id', async (request, response) => {
      const id = idOf(request, 'id')
      const person = await changePerson(db, whoOf(response), id, seenVersion(request), parse(personChange, request.body))
      tellVersion(response, person.version)
      response.json(person)
    })
    .post('/people/:id/invitation', async (request, response) => {
      parse(z.strictObject({}), request.body)
      const person = await repeatInvitation(db, whoOf(response), origin, idOf(request, 'id'))
      tellVersion(response, person.version)
      response.json(person)
    })
}
