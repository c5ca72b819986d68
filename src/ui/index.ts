/** Door of the user interface (level 4): may use `units`, `blending` and `state`. */
import './styles/index.css';

export { App } from './App.tsx';
export { WorkspaceProvider } from './bindings/workspace.tsx';
export { CalculatorProvider } from './bindings/calculator.tsx';
export { StockroomProvider } from './bindings/stockroom.tsx';
export { printedNow } from './parts/printing.ts';
