import '@fontsource/source-sans-3/400.css';
import '@fontsource/source-sans-3/600.css';
import '@fontsource/source-sans-3/900.css';
import { createRoot } from 'react-dom/client';
import { App } from './app/App';
import { startColorMode } from './theme/colorMode';

startColorMode();
const root = document.getElementById('root');
if (!root) throw new Error('index.html has no #root');
createRoot(root).render(<App />);
