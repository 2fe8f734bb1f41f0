/** Every screen behind the list of jobs, in one chunk that is fetched once the list has painted. */
export { CalculationScreen } from './calculation/calculation-screen'
export { EdgeScreen } from './edge/edge-screen'
export { OpenJob } from './editing/open-job'
export { JobBasisScreen } from './job/basis-screen'
export { JobPeopleScreen } from './job/people-screen'
export { JobScreen } from './job/job-screen'
export { NewPourScreen } from './pour/new-pour-screen'
export { PourScreen } from './pour/pour-screen'
export { PourZonesScreen } from './pour/zones-screen'
export { ScheduleScreen } from './schedule/schedule-screen'
/** The reader of layout files goes with them: the list of jobs, which imports files, does without the contract. */
export { readLayoutText } from '@wedgeline/contract'
