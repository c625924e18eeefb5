package connate.core;

import connate.method.MethodCard;
import java.util.function.DoubleUnaryOperator;

/**
 * How the slip factor of a gas falls with permeability: b in psi as a function of the liquid
 * permeability in mD.
 *
 * @param card what the law states of itself
 * @param psi b in psi at a liquid permeability in mD
 */
public record SlipLaw(MethodCard card, DoubleUnaryOperator psi) {}
