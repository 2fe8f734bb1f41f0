export { toSi } from './si'
export { idSchema } from './fields'
export { steelShapeSchema, type SteelData, type SteelShapeData, type SteelZoneData } from './steel-schema'
export {
  hardwareSchema,
  jackSchema,
  strandTypeSchema,
  type HardwareData,
  type JackData,
  type StrandTypeData,
} from './hardware-schema'
export {
  LAYOUT_FORMAT,
  LAYOUT_VERSION,
  LIMITS,
  jobSettingsSchema,
  layoutSchema,
  toEngine,
  type AnchorData,
  type EdgeData,
  type EdgeLineData,
  type JobData,
  type LayoutFile,
  type LayoutInput,
  type PourData,
  type PanData,
  type TendonData,
} from './layout'
export {
  CommandError,
  EDITABLE_TABLES,
  applyCommands,
  batchSchema,
  type Applied,
  type Batch,
  type Command,
  type Conflict,
  type EditableTable,
  type Row,
} from './commands'
export {
  ROLES,
  acceptInvitationSchema,
  acceptReadingSchema,
  askResetSchema,
  auditListSchema,
  byCompanySchema,
  byJobSchema,
  byPourSchema,
  companyNameSchema,
  fileQuickEdgeSchema,
  importLayoutSchema,
  invitationSchema,
  invitationTokenSchema,
  jobBasisSchema,
  jobMemberSchema,
  jobTitleSchema,
  memberSchema,
  newJobSchema,
  resetPasswordSchema,
  saveHardwareSchema,
  saveJackSchema,
  saveStrandTypeSchema,
  setRolesSchema,
  signInSchema,
  withdrawInvitationSchema,
  withdrawReadingSchema,
  type Role,
} from './api'
export { alongLine, fieldOf, hardwareProblems, isTimeZone, layoutProblems, type Problem } from './problems'
export { PROBLEMS_MAX, readLayout, readLayoutText, type ReadLayout } from './read-layout'
export { ENGINE_VERSION } from './engine-version'
