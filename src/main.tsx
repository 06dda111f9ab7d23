import { config } from 'zod';
import './styles.css';

// zod looks whether it may compile its schemas, which the content security policy forbids and the browser then reports.
// It looks when the first schema is made: so everything with schemas comes after this.
config({ jitless: true });
void import('./start.tsx');
