/** Edge wedges as screens draw them: the ones that the checks of gaps and corners are made with. */
export { cornerWedges } from './wedge/corner-wedge'
export { wedgesOfEdge } from './wedge/wedges-of-edge'
