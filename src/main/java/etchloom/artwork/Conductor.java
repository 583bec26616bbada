package etchloom.artwork;

import etchloom.geometry.Path;

/**
 * A track of one width on one layer, from one joint to another; it touches no joint in between.
 *
 * @param id its place in {@link Artwork#conductors()}
 * @param layer from 1
 * @param path centre line, walked from {@code fromJoint} to {@code toJoint}; round ends and joints
 */
public record Conductor(
    int id,
    int layer,
    double widthMm,
    Path path,
    int fromJoint,
    int toJoint,
    String net,
    Feature what) {}
