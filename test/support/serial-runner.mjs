import TestRunner from 'jest-runner';

/** Runs its files one after another: the browser tests share one machine's ports, memory and processor. */
export default class SerialRunner extends TestRunner {
  isSerial = true;
}
