import { createCustomFunctions } from '../grid/customFunctions';
import { startFailures } from './startFailures';

// Loaded before the functions bundle: what that associates is kept where the page finds it.
Object.assign(globalThis, { CustomFunctions: createCustomFunctions() });
startFailures();
