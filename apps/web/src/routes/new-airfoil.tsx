export { NewAirfoilPage as Component } from '../features/airfoils/components/new-airfoil-page.tsx';
