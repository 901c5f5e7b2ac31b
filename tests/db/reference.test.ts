import { describe, expect, test } from 'vitest'
import { crateModelSpecSchema } from '@/models/crate-model'
import { catalogue, profileValues } from '@/lib/species'
import { models } from '@/models'
import { seed } from '@/seeders/01-reference'
import { CRATE_MODELS } from '@/seeders/crate-models'
import { asOwner, withEmptyTables } from '../support/db'

withEmptyTables()

describe('reference rows', () => {
  test('are all there, once, however often they are put in', async () => {
    await seed()
    expect(await seed()).toEqual({ species: 0, crateModels: 0 })
    expect(await models.SpeciesProfile.count({ where: { createdBy: null } })).toBe(
      Object.keys(catalogue).length,
    )
    expect(await models.CrateModel.count()).toBe(CRATE_MODELS.length)
  })

  test('read back as they were shipped, ready for the engine', async () => {
    await seed()
    for (const row of await models.SpeciesProfile.findAll()) {
      const shipped = catalogue[row.key]
      expect(shipped && profileValues(row.profile), row.key).toEqual(shipped && profileValues(shipped))
    }
  })

  test('leave alone what an admin has changed', async () => {
    await seed()
    const model = await models.CrateModel.findOne({ where: { name: 'Corran 3, dog crate' } })
    await model?.update({ active: false })
    await seed()
    expect((await model?.reload())?.active).toBe(false)
    await model?.update({ active: true })
  })

  test('refuse other figures under the same version', async () => {
    await seed()
    const row = await models.SpeciesProfile.findOne({ where: { key: 'dog' } })
    const stored = JSON.stringify(row?.profile)
    const change = (profile: string) =>
      asOwner((owner) =>
        owner.query("UPDATE species_profiles SET profile = ? WHERE `key` = 'dog'", {
          replacements: [profile],
        }),
      )
    await change(stored.replace('"version":1', '"version":1,"added":true'))
    await expect(seed()).rejects.toThrow('Raise its version')
    await change(stored)
    await expect(seed()).resolves.toBeDefined()
  })
})

test.each(CRATE_MODELS)('$name: as the form allows it, and no opening larger than its face', ({ spec }) => {
  expect(crateModelSpecSchema.parse(spec)).toEqual(spec)
  const [length, width, height] = [spec.lengthCm ?? 0, spec.widthCm ?? 0, spec.heightCm ?? 0]
  const faces = {
    front: [width, height],
    back: [width, height],
    left: [length, height],
    right: [length, height],
    top: [length, width],
  }
  for (const { face, widthCm, heightCm, howMany, sillHeightCm } of spec.openings) {
    const [across = 0, up = 0] = faces[face]
    expect(widthCm * heightCm * howMany, face).toBeLessThan(across * up * 0.9)
    expect([widthCm <= across, heightCm + (sillHeightCm ?? 0) <= up], face).toEqual([true, true])
  }
})
