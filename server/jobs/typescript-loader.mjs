// Loaded before a worker thread that runs from source: `--import tsx` alone leaves threads as they are.
import { register } from 'tsx/esm/api';

register();
