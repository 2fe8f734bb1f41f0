/** Screens of a company and of the product itself, in one chunk that is fetched when one of them is opened. */
export { CompanyScreen } from './company/company-screen'
export { PeopleScreen } from './company/people-screen'
export { HardwareListScreen } from './hardware/hardware-list-screen'
export { HardwareScreen } from './hardware/hardware-screen'
export { MethodsScreen } from './methods/methods-screen'
