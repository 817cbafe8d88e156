import app from './app.json';
import auth from './auth.json';
import company from './company.json';
import edits from './edits.json';
import explain from './explain.json';
import findings from './findings.json';
import jobs from './jobs.json';
import strip from './strip.json';
import workbench from './workbench.json';

/** Every English word a person reads, by the area it belongs to. */
export const en = { app, auth, company, edits, explain, findings, jobs, strip, workbench };
