import { serve } from '../child/serve';
import { printCertificate } from './print-certificate';

serve(printCertificate);
