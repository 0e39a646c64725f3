export { PaperMaking } from './paper-making';
