package torqueloom.model.dynamics;

/**
 * Numbers of one readout update, in float.
 *
 * @param constant c_0 (1)
 * @param linear c_1 (1)
 * @param quadratic c_2 (1)
 * @param filter filter over one frame
 * @param low lower threshold (1)
 * @param high upper threshold (1)
 */
record ReadConstants(
    float constant, float linear, float quadratic, FilterStep filter, float low, float high) {

  static ReadConstants of(SignalChain chain, double frame) {
    return new ReadConstants(
        (float) chain.constant(),
        (float) chain.linear(),
        (float) chain.quadratic(),
        FilterStep.of(chain, frame),
        (float) chain.low(),
        (float) chain.high());
  }
}
