import type { MixBranch } from './mixPlan';

/** Long enough not to click, short enough to sound at once. Common practice, no source. */
const switchS = 0.012;

export interface ChoiceMixer {
  /** Two channels: kick left, overhead right. */
  readonly input: AudioNode;
  readonly output: GainNode;
  select(index: number): void;
  update(plan: readonly MixBranch[]): void;
  dispose(): void;
}

/**
 * One finished mix a choice, all running in step from the same source; choosing crossfades between them. As they stem
 * from the same samples, switching is sample-locked and nothing starts anew.
 */
export function createChoiceMixer(
  context: BaseAudioContext,
  plan: readonly MixBranch[],
  selected: number,
): ChoiceMixer {
  const input = context.createChannelSplitter(2);
  const output = context.createGain();
  const branches = plan.map((branch, i) =>
    createBranch({ context, branch, input, output, on: i === selected }),
  );
  return {
    input,
    output,
    select(index) {
      branches.forEach((branch, i) => ramp(context, branch.fade.gain, i === index ? 1 : 0));
    },
    update(next) {
      branches.forEach((branch, i) => {
        const to = next[i];
        if (!to) return;
        ramp(context, branch.kickGain.gain, to.kickGain);
        ramp(context, branch.overheadGain.gain, to.overheadGain);
        ramp(context, branch.kickDelay.delayTime, to.kickDelayS);
        ramp(context, branch.overheadDelay.delayTime, to.overheadDelayS);
      });
    },
    dispose() {
      input.disconnect();
      output.disconnect();
      branches.forEach((branch) => branch.fade.disconnect());
    },
  };
}

function ramp(context: BaseAudioContext, param: AudioParam, to: number) {
  const now = context.currentTime;
  param.cancelScheduledValues(now);
  param.setValueAtTime(param.value, now);
  param.linearRampToValueAtTime(to, now + switchS);
}

function createBranch({
  context,
  branch,
  input,
  output,
  on,
}: {
  context: BaseAudioContext;
  branch: MixBranch;
  input: AudioNode;
  output: AudioNode;
  on: boolean;
}) {
  const kickDelay = new DelayNode(context, { maxDelayTime: 1, delayTime: branch.kickDelayS });
  const overheadDelay = new DelayNode(context, { maxDelayTime: 1, delayTime: branch.overheadDelayS });
  const kickGain = new GainNode(context, { gain: branch.kickGain });
  const overheadGain = new GainNode(context, { gain: branch.overheadGain });
  const fade = new GainNode(context, { gain: on ? 1 : 0 });
  input.connect(kickDelay, 0).connect(kickGain).connect(fade);
  input.connect(overheadDelay, 1).connect(overheadGain).connect(fade);
  fade.connect(output);
  return { kickDelay, overheadDelay, kickGain, overheadGain, fade };
}
