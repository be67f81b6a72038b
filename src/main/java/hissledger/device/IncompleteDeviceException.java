package hissledger.device;

/** A device sheet lacks a parameter that the calculation needs and for which there is no documented default. */
public final class IncompleteDeviceException extends IllegalArgumentException {
    private static final long serialVersionUID = 1L;

    /** Names the device and the parameter. */
    public IncompleteDeviceException(String deviceId, String parameterKey) {
        super("device " + deviceId + " states no " + parameterKey
                + ", which the calculation needs; add it to its file");
    }
}
