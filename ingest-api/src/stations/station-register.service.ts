import { Injectable, type OnModuleInit } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { Sequelize } from 'sequelize-typescript';
import { Instrument } from './models/instrument.model.js';
import { Station } from './models/station.model.js';

/** Stations and instruments in memory: each post asks for its meters' accuracy and calibration. */
@Injectable()
export class StationRegister implements OnModuleInit {
  private stations = new Map<number, Station>();
  private instruments = new Map<string, Instrument>();

  // Asked for so that the models are bound to their database before the first read.
  constructor(@InjectConnection() _sequelize: Sequelize) {}

  onModuleInit(): Promise<void> {
    return this.reload();
  }

  async reload(): Promise<void> {
    const [stations, instruments] = await Promise.all([Station.findAll(), Instrument.findAll()]);
    this.stations = new Map(stations.map((station) => [station.stationId, station]));
    this.instruments = new Map(instruments.map((one) => [keyOf(one.kind, one.serialNumber), one]));
  }

  all(): Station[] {
    return [...this.stations.values()].sort((a, b) => a.name.localeCompare(b.name));
  }

  byId(stationId: number): Station {
    const station = this.stations.get(stationId);
    if (station === undefined) throw new Error(`Station ${stationId} is not in the register`);
    return station;
  }

  byName(name: string): Station | undefined {
    return this.all().find((station) => station.name === name);
  }

  instrument(kind: Instrument['kind'], serialNumber: string | undefined): Instrument | undefined {
    return serialNumber === undefined ? undefined : this.instruments.get(keyOf(kind, serialNumber));
  }

  instrumentsOf(stationId: number): Instrument[] {
    return [...this.instruments.values()].filter((one) => one.stationId === stationId);
  }
}

const keyOf = (kind: Instrument['kind'], serialNumber: string): string => `${kind} ${serialNumber}`;
