import { useState } from 'react';

/** Does something and reads anew what it changed; where it was refused, says why in one sentence. */
export function useRefusal(readAgain: () => Promise<unknown>) {
  const [refusal, setRefusal] = useState('');
  const act = async (write: () => Promise<unknown>): Promise<boolean> => {
    setRefusal('');
    let done = true;
    try {
      await write();
    } catch (error) {
      done = false;
      setRefusal(error instanceof Error ? error.message : 'That did not work. Try again.');
    }
    await readAgain();
    return done;
  };
  return { refusal, act };
}
