export { ProgrammesPage as Component } from '../features/programmes/components/home/programmes-page.tsx';
