import { RateOverrideEntity } from './project/RateOverrideEntity'
import { AuditEntity } from './AuditEntity'
import { ContactEntity } from './dispatch/ContactEntity'
import { DispatchEntity } from './dispatch/DispatchEntity'
import { OutboxEntity } from './dispatch/OutboxEntity'
import { FirmEntity } from './firm/FirmEntity'
import { PersonEntity } from './firm/PersonEntity'
import { PersonRoleEntity } from './firm/PersonRoleEntity'
import { IdempotencyEntity } from './IdempotencyEntity'
import { LevelEntity } from './project/LevelEntity'
import { ProjectEntity } from './project/ProjectEntity'
import { ProjectShareEntity } from './project/ProjectShareEntity'
import { SchemeEntity } from './project/SchemeEntity'
import { BlockEntity } from './rates/BlockEntity'
import { EditionEditorEntity } from './rates/EditionEditorEntity'
import { EditionEntity } from './rates/EditionEntity'
import { GangEntity } from './rates/GangEntity'
import { QuotationEntity } from './rates/QuotationEntity'
import { RateBookEntity } from './rates/RateBookEntity'
import { RateEntity } from './rates/RateEntity'
import { RateImportEntity } from './rates/RateImportEntity'
import { RateImportRowEntity } from './rates/RateImportRowEntity'
import { RateImportWriteEntity } from './rates/RateImportWriteEntity'
import { ResourceEntity } from './rates/ResourceEntity'
import { AttemptEntity } from './session/AttemptEntity'
import { RefreshTokenEntity } from './session/RefreshTokenEntity'
import { SessionEntity } from './session/SessionEntity'
import { SingleUseTokenEntity } from './session/SingleUseTokenEntity'

/** Every table the schema has. */
export const ENTITIES = [
  FirmEntity,
  PersonEntity,
  PersonRoleEntity,
  AuditEntity,
  IdempotencyEntity,
  SessionEntity,
  RefreshTokenEntity,
  SingleUseTokenEntity,
  AttemptEntity,
  RateBookEntity,
  EditionEntity,
  RateEntity,
  EditionEditorEntity,
  ResourceEntity,
  GangEntity,
  QuotationEntity,
  RateImportEntity,
  RateImportRowEntity,
  RateImportWriteEntity,
  BlockEntity,
  ProjectEntity,
  LevelEntity,
  SchemeEntity,
  ProjectShareEntity,
  RateOverrideEntity,
  ContactEntity,
  DispatchEntity,
  OutboxEntity,
]
