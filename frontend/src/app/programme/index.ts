export { EstimateProgramme } from './plan/estimate-programme';
