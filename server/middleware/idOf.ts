import { id } from '#shared/contracts/primitives'
import type { Request } from 'express'
import { parse } from '../errors'

/** Id in the address, by the name of its parameter. @throws AppError `invalid_request` when it is no id */
export const idOf = (request: Request, name: string): string => parse(id, request.params[name], name).toLowerCase()
