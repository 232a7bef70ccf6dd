package irreproof.server;

import java.util.Arrays;
import java.util.Optional;

/** The units in which a client counts along a line. */
enum PositionEncoding {
    UTF_8("utf-8") {
        @Override
        int units(int codePoint) {
            return codePoint < 0x80 ? 1 : codePoint < 0x800 ? 2 : codePoint < 0x10000 ? 3 : 4;
        }
    },
    UTF_16("utf-16") {
        @Override
        int units(int codePoint) {
            return Character.charCount(codePoint);
        }
    },
    UTF_32("utf-32") {
        @Override
        int units(int codePoint) {
            return 1;
        }
    };

    private final String word;

    PositionEncoding(String word) {
        this.word = word;
    }

    /** How many units one code point counts. */
    abstract int units(int codePoint);

    /** As the protocol writes it. */
    String word() {
        return word;
    }

    static Optional<PositionEncoding> named(String word) {
        return Arrays.stream(values())
                .filter(encoding -> encoding.word.equals(word))
                .findFirst();
    }
}
