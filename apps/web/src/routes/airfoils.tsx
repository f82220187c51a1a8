export { AirfoilsPage as Component } from '../features/airfoils/components/airfoils-page.tsx';
