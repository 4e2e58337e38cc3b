import { runProgram } from '../common/program';
import { startMail } from './server';
import { readSettings } from './settings';

void runProgram(() => startMail(readSettings(process.env)));
