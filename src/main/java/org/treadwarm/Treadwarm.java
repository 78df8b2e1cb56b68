package org.treadwarm;

/** The program. */
public final class Treadwarm {
    private Treadwarm() {}

    public static void main(String[] args) {
        System.out.println("Treadwarm");
    }
}
