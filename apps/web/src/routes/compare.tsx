export { ComparePage as Component } from '../features/compare/components/compare-page.tsx';
