package hissledger.physics;

/** Shot noise of a current that crosses a barrier (W. Schottky, Ann. Phys. 57 (1918) 541). */
public final class ShotNoise {
    private ShotNoise() {}

    /**
     * {@code S_i = 2 q I}, one-sided, white far below the inverse transit time.
     *
     * @param currentAmps magnitude of the direct current I, A; ≥ 0
     * @return A²/Hz
     */
    public static double ampsSquaredPerHertz(double currentAmps) {
        Require.notNegative("currentAmps", currentAmps, "A");
        return 2.0 * Constants.ELEMENTARY_CHARGE_COULOMBS * currentAmps;
    }
}
