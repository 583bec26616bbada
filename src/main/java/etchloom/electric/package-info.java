/** What the copper does: resistance, inductance, field, EMF, torque, loss, heat, drive values. */
package etchloom.electric;
