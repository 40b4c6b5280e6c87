export { keepFit } from './keepFit';
export { listFits, readFit, type FitRead } from './readFits';
