import { serve } from '../child/serve';
import { cleanCopies } from './clean-copies';

serve(cleanCopies);
