import { z } from 'zod'
import type { InvitationInput, Person, PersonChange } from '#shared/contracts/person'
import { person } from '#shared/contracts/person'
import { request } from './http'

export const listPeople = (): Promise<Person[]> => request(z.array(person), 'GET', '/api/people')

export const invitePerson = (input: InvitationInput, idempotencyKey: string): Promise<Person> =>
  request(person, 'POST', '/api/people', { body: input, idempotencyKey })

export const changePerson = (id: string, version: number, input: PersonChange): Promise<Person> =>
  request(person, 'PUT', `/api/people/${id}`, { body: input, version })
