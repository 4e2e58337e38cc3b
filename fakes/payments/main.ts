import { runProgram } from '../common/program';
import { startPayments } from './server';
import { readSettings } from './settings';

void runProgram(() => startPayments(readSettings(process.env)));
