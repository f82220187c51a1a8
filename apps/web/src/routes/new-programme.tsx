export { NewProgrammePage as Component } from '../features/programmes/components/specification/new-programme-page.tsx';
