import { CreateRateOverride1796100000081 } from './project/1796100000081-CreateRateOverride'
import { AddBlockPriceCode1796100000080 } from './rates/1796100000080-AddBlockPriceCode'
import { CreateAudit1796100000004 } from './1796100000004-CreateAudit'
import { CreateIdempotency1796100000005 } from './1796100000005-CreateIdempotency'
import { CreateContact1796100000040 } from './dispatch/1796100000040-CreateContact'
import { CreateDispatch1796100000041 } from './dispatch/1796100000041-CreateDispatch'
import { CreateOutbox1796100000042 } from './dispatch/1796100000042-CreateOutbox'
import { CreateFirm1796100000001 } from './firm/1796100000001-CreateFirm'
import { CreatePerson1796100000002 } from './firm/1796100000002-CreatePerson'
import { CreatePersonRole1796100000003 } from './firm/1796100000003-CreatePersonRole'
import { CreateProject1796100000014 } from './project/1796100000014-CreateProject'
import { CreateLevel1796100000015 } from './project/1796100000015-CreateLevel'
import { CreateScheme1796100000016 } from './project/1796100000016-CreateScheme'
import { AddLevelProppingHeight1796100000045 } from './project/1796100000045-AddLevelProppingHeight'
import { AddProjectScope1796100000043 } from './project/1796100000043-AddProjectScope'
import { CreateProjectShare1796100000017 } from './project/1796100000017-CreateProjectShare'
import { CreateRateBook1796100000010 } from './rates/1796100000010-CreateRateBook'
import { CreateEdition1796100000011 } from './rates/1796100000011-CreateEdition'
import { CreateRate1796100000012 } from './rates/1796100000012-CreateRate'
import { CreateBlock1796100000013 } from './rates/1796100000013-CreateBlock'
import { KeepPublishedEdition1796100000018 } from './rates/keep/1796100000018-KeepPublishedEdition'
import { KeepEditionRow1796100000019 } from './rates/keep/1796100000019-KeepEditionRow'
import { KeepRateInsert1796100000020 } from './rates/keep/1796100000020-KeepRateInsert'
import { KeepRateUpdate1796100000021 } from './rates/keep/1796100000021-KeepRateUpdate'
import { KeepRateDelete1796100000022 } from './rates/keep/1796100000022-KeepRateDelete'
import { AddEditionReason1796100000050 } from './rates/1796100000050-AddEditionReason'
import { AddRateBuildUp1796100000051 } from './rates/1796100000051-AddRateBuildUp'
import { CreateEditionEditor1796100000052 } from './rates/1796100000052-CreateEditionEditor'
import { CreateResource1796100000053 } from './rates/1796100000053-CreateResource'
import { CreateGang1796100000054 } from './rates/1796100000054-CreateGang'
import { CreateQuotation1796100000055 } from './rates/1796100000055-CreateQuotation'
import { AddEditionStateReason1796100000056 } from './rates/1796100000056-AddEditionStateReason'
import { KeepEditionFacts1796100000057 } from './rates/keep/1796100000057-KeepEditionFacts'
import { KeepResourceInsert1796100000058 } from './rates/keep/1796100000058-KeepResourceInsert'
import { KeepResourceUpdate1796100000059 } from './rates/keep/1796100000059-KeepResourceUpdate'
import { KeepResourceDelete1796100000060 } from './rates/keep/1796100000060-KeepResourceDelete'
import { KeepGangInsert1796100000061 } from './rates/keep/1796100000061-KeepGangInsert'
import { KeepGangUpdate1796100000062 } from './rates/keep/1796100000062-KeepGangUpdate'
import { KeepGangDelete1796100000063 } from './rates/keep/1796100000063-KeepGangDelete'
import { KeepQuotationInsert1796100000064 } from './rates/keep/1796100000064-KeepQuotationInsert'
import { KeepQuotationUpdate1796100000065 } from './rates/keep/1796100000065-KeepQuotationUpdate'
import { KeepQuotationDelete1796100000066 } from './rates/keep/1796100000066-KeepQuotationDelete'
import { KeepRatePlace1796100000067 } from './rates/keep/1796100000067-KeepRatePlace'
import { CreateRateImport1796100000075 } from './rates/1796100000075-CreateRateImport'
import { CreateRateImportRow1796100000076 } from './rates/1796100000076-CreateRateImportRow'
import { CreateRateImportWrite1796100000077 } from './rates/1796100000077-CreateRateImportWrite'
import { CreateSession1796100000006 } from './session/1796100000006-CreateSession'
import { CreateRefreshToken1796100000007 } from './session/1796100000007-CreateRefreshToken'
import { CreateSingleUseToken1796100000008 } from './session/1796100000008-CreateSingleUseToken'
import { CreateAttempt1796100000009 } from './session/1796100000009-CreateAttempt'

/** Every step of the schema, in the order it is taken. One statement each, so that a step broken off can be taken again. */
export const MIGRATIONS = [
  CreateFirm1796100000001,
  CreatePerson1796100000002,
  CreatePersonRole1796100000003,
  CreateAudit1796100000004,
  CreateIdempotency1796100000005,
  CreateSession1796100000006,
  CreateRefreshToken1796100000007,
  CreateSingleUseToken1796100000008,
  CreateAttempt1796100000009,
  CreateRateBook1796100000010,
  CreateEdition1796100000011,
  CreateRate1796100000012,
  CreateBlock1796100000013,
  CreateProject1796100000014,
  CreateLevel1796100000015,
  CreateScheme1796100000016,
  CreateProjectShare1796100000017,
  KeepPublishedEdition1796100000018,
  KeepEditionRow1796100000019,
  KeepRateInsert1796100000020,
  KeepRateUpdate1796100000021,
  KeepRateDelete1796100000022,
  CreateContact1796100000040,
  CreateDispatch1796100000041,
  CreateOutbox1796100000042,
  AddProjectScope1796100000043,
  AddLevelProppingHeight1796100000045,
  AddEditionReason1796100000050,
  AddRateBuildUp1796100000051,
  CreateEditionEditor1796100000052,
  CreateResource1796100000053,
  CreateGang1796100000054,
  CreateQuotation1796100000055,
  AddEditionStateReason1796100000056,
  KeepEditionFacts1796100000057,
  KeepResourceInsert1796100000058,
  KeepResourceUpdate1796100000059,
  KeepResourceDelete1796100000060,
  KeepGangInsert1796100000061,
  KeepGangUpdate1796100000062,
  KeepGangDelete1796100000063,
  KeepQuotationInsert1796100000064,
  KeepQuotationUpdate1796100000065,
  KeepQuotationDelete1796100000066,
  KeepRatePlace1796100000067,
  CreateRateImport1796100000075,
  CreateRateImportRow1796100000076,
  CreateRateImportWrite1796100000077,
  AddBlockPriceCode1796100000080,
  CreateRateOverride1796100000081,
]
